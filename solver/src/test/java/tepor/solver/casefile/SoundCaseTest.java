package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.outline.Finding;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition.Film;
import tepor.solver.model.EdgeCondition.FixedTemperature;
import tepor.solver.model.EdgeCondition.Inflow;
import tepor.solver.model.EdgeCondition.InflowBasis;
import tepor.solver.model.EdgeCondition.SurfaceResistance;
import tepor.solver.model.HeatSource;
import tepor.solver.model.Input;
import tepor.solver.model.Limit;
import tepor.solver.model.Material;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.MeshRequest.Refinement;
import tepor.solver.model.Region;
import tepor.solver.model.Target;
import tepor.solver.model.Within;
import tepor.solver.quantity.Spread.Distribution;

/** One case with all that the format has in this version, compared field by field. */
class SoundCaseTest {
    private static final Offset<Double> EXACT = within(1e-12);

    @TempDir
    Path folder;

    private Path file;
    private Case subject;

    @BeforeEach
    void read() throws Exception {
        file = Path.of(SoundCaseTest.class.getResource("busbar-duct/case.toml").toURI());
        subject = CaseReader.read(file);
    }

    @Test
    void theHead() {
        assertThat(subject.name()).isEqualTo("busbar-duct");
        assertThat(subject.title()).isEqualTo("Busbar duct in a pump house");
        assertThat(subject.depth().path()).isEqualTo("depth");
        assertThat(subject.depth().quantity().value()).isEqualTo(2.5);
        assertThat(subject.reportFields().keySet())
                .containsExactly(
                        "project",
                        "document",
                        "revision",
                        "purpose",
                        "drawing",
                        "standard",
                        "prepared",
                        "checked",
                        "approved");
        assertThat(subject.reportFields()).containsEntry("drawing", "D-4").containsEntry("checked", "second");
        assertThat(subject.unit().symbol()).isEqualTo("mm");
        assertThat(subject.unit().metres()).isEqualTo(0.001);
        assertThat(subject.accuracy().adapt()).isFalse();
        assertThat(subject.accuracy().confidence()).isCloseTo(0.99, EXACT);
    }

    @Test
    void theFilesWithTheirDigests() throws Exception {
        assertThat(subject.files()).extracting("name").containsExactly("case.toml", "duct.wkt");
        byte[] digest =
                MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file.resolveSibling("duct.wkt")));
        assertThat(subject.files().get(1).sha256()).isEqualTo(HexFormat.of().formatHex(digest));
    }

    @Test
    void theRegionsInTheOrderTheyAreLaid() {
        assertThat(subject.regions()).extracting(Region::name).containsExactly("resin", "bars", "shim", "wire", "void");
        assertThat(subject.regions()).extracting(Region::index).containsExactly(0, 1, 2, 3, 4);
        assertThat(subject.regions()).extracting(Region::isHole).containsExactly(false, false, false, false, true);
        assertThat(subject.section().regionCount()).isEqualTo(5);
        // 200·100 less two bars of 40·20, a shim of 20·20, a wire of 4·4 and a void of 20·20, mm²
        assertThat(subject.section().area(0)).isCloseTo(17584e-6, EXACT);
        assertThat(subject.section().area(1)).isCloseTo(1600e-6, EXACT);
        assertThat(subject.section().snap()).isCloseTo(1e-5, EXACT);
        heat(1, HeatSource.Basis.PER_LENGTH, 42);
        heat(2, HeatSource.Basis.PER_VOLUME, 1.2e6);
        heat(3, HeatSource.Basis.TOTAL, 90);
        assertThat(subject.regions().get(0).heat()).isNull();
        Input bars = subject.inputs().find("region.bars.heat").orElseThrow();
        assertThat(bars.quantity().spread().distribution()).isEqualTo(Distribution.RECTANGULAR);
        assertThat(bars.quantity().spread().halfWidth()).isCloseTo(3, EXACT);
        assertThat(bars.place().line()).isEqualTo(29);
    }

    private void heat(int region, HeatSource.Basis basis, double value) {
        HeatSource heat = subject.regions().get(region).heat();
        assertThat(heat.basis()).isEqualTo(basis);
        assertThat(heat.amount().quantity().value()).isCloseTo(value, within(1e-9 * value));
    }

    @Test
    void theMaterials() {
        assertThat(subject.materials()).extracting(Material::name).containsExactly("resin", "copper", "v1.2 wood");
        Material resin = subject.materials().get(0);
        assertThat(subject.regions().get(0).material()).isSameAs(resin);
        Conductivity.Uniform k = (Conductivity.Uniform) resin.conductivity();
        assertThat(k.k().path()).isEqualTo("material.resin.k");
        assertThat(k.k().quantity().value()).isCloseTo(0.65, EXACT);
        assertThat(k.k().quantity().spread().halfWidth()).isCloseTo(0.065, EXACT);
        assertThat(resin.density().quantity().value()).isCloseTo(1700, EXACT);
        assertThat(resin.heatCapacity().path()).isEqualTo("material.resin.heat_capacity");
        assertThat(resin.source()).isEqualTo("supplier's data sheet, nominal");
        Material copper = subject.materials().get(1);
        assertThat(copper.density()).isNull();
        assertThat(copper.source()).isEmpty();
        Conductivity.Directional wood =
                (Conductivity.Directional) subject.materials().get(2).conductivity();
        assertThat(wood.along().path()).isEqualTo("material.\"v1.2 wood\".k.along");
        assertThat(wood.across().quantity().value()).isCloseTo(0.25, EXACT);
        assertThat(wood.angle().quantity().value()).isCloseTo(Math.PI / 6, EXACT);
    }

    @Test
    void theAirs() {
        assertThat(subject.airs()).extracting(Air::name).containsExactly("room", "cellar");
        Air room = subject.airs().get(0);
        assertThat(room.temperature().quantity().value()).isCloseTo(308.15, EXACT);
        assertThat(room.film().path()).isEqualTo("air.room.film");
        assertThat(subject.airs().get(1).film()).isNull();
        assertThat(subject.airs().get(1).temperature().quantity().value()).isCloseTo(283.15, EXACT);
    }

    @Test
    void theEdgesAndWhatHoldsOnThem() {
        assertThat(subject.edges())
                .extracting(Edge::name)
                .containsExactly("lid", "sole", "flank", "right", "duct", "outside", "bar skin");
        Air room = subject.airs().get(0);
        Air cellar = subject.airs().get(1);
        assertThat(edge("lid").conditions()).containsExactly(new Film(room.film(), room.temperature(), room));
        Input resistance = subject.inputs().find("edge.sole.resistance").orElseThrow();
        assertThat(edge("sole").conditions())
                .containsExactly(
                        new SurfaceResistance(resistance, cellar.temperature(), cellar),
                        new Inflow(subject.inputs().find("edge.sole.inflow").orElseThrow(), InflowBasis.PER_AREA));
        Input inlineAir = subject.inputs().find("edge.flank.air").orElseThrow();
        assertThat(inlineAir.quantity().value()).isCloseTo(291.15, EXACT);
        assertThat(edge("flank").conditions())
                .containsExactly(
                        new Film(subject.inputs().find("edge.flank.film").orElseThrow(), inlineAir, null));
        assertThat(edge("right").conditions()).isEmpty();
        assertThat(edge("right").insulated()).isEqualTo("symmetry plane");
        assertThat(edge("lid").insulated()).isEmpty();
        assertThat(edge("duct").conditions())
                .containsExactly(new FixedTemperature(
                        subject.inputs().find("edge.duct.temperature").orElseThrow()));
        assertThat(edge("outside").conditions())
                .containsExactly(
                        new Inflow(subject.inputs().find("edge.outside.inflow").orElseThrow(), InflowBasis.PER_LENGTH));
        assertThat(edge("bar skin").conditions()).isEmpty();
    }

    @Test
    void theLengthsOfTheEdges() {
        assertThat(length("lid")).isCloseTo(0.2, EXACT);
        assertThat(length("sole")).isCloseTo(0.1, EXACT); // split where its line ends
        assertThat(length("flank")).isCloseTo(0.1, EXACT);
        assertThat(length("duct")).isCloseTo(0.08, EXACT);
        assertThat(length("outside")).isCloseTo(0.1, EXACT); // what others leave of the bottom
        assertThat(length("bar skin")).isCloseTo(0.24, EXACT);
    }

    private Edge edge(String name) {
        return subject.edges().stream()
                .filter(e -> e.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    private double length(String name) {
        return edge(name).pieces().length(subject.section());
    }

    @Test
    void theAsks() {
        assertThat(subject.asks())
                .extracting(Ask::name)
                .containsExactly(
                        "hottest bar",
                        "coldest",
                        "mean of skin",
                        "spot",
                        "to the room",
                        "through the sole",
                        "L2D",
                        "psi",
                        "f",
                        "drop");
        Ask.Peak peak = (Ask.Peak) subject.asks().get(0);
        assertThat(peak.target())
                .isEqualTo(new Target.OfRegion(subject.regions().get(1)));
        assertThat(peak.head().limit().relation()).isEqualTo(Limit.Relation.AT_MOST);
        assertThat(peak.head().limit().quantity().value()).isCloseTo(378.15, EXACT);
        assertThat(peak.head().within()).isEqualTo(new Within.Absolute(0.2));
        Ask.Lowest lowest = (Ask.Lowest) subject.asks().get(1);
        assertThat(lowest.target()).isEqualTo(new Target.Everything());
        assertThat(lowest.head().within()).isEqualTo(new Within.Fraction(0.01));
        assertThat(lowest.head().limit()).isNull();
        Ask.Mean mean = (Ask.Mean) subject.asks().get(2);
        assertThat(mean.target()).isEqualTo(new Target.OfEdge(edge("bar skin")));
        assertThat(mean.head().limit().relation()).isEqualTo(Limit.Relation.AT_LEAST);
        assertThat(mean.head().within()).isEqualTo(new Within.Fraction(0.02));
        Ask.At at = (Ask.At) subject.asks().get(3);
        assertThat(at.x()).isCloseTo(0.07, EXACT);
        assertThat(at.y()).isCloseTo(0.05, EXACT);
        Ask.Flow flow = (Ask.Flow) subject.asks().get(4);
        assertThat(flow.target()).isEqualTo(new Target.OfAir(subject.airs().get(0)));
        assertThat(flow.head().with())
                .containsOnlyKeys(
                        subject.inputs().find("edge.flank.film").orElseThrow(),
                        subject.airs().get(0).temperature())
                .containsValue(303.15);
        assertThat(((Ask.Flow) subject.asks().get(5)).target()).isEqualTo(new Target.OfEdge(edge("sole")));
        Ask.Coupling coupling = (Ask.Coupling) subject.asks().get(6);
        assertThat(coupling.from().name()).isEqualTo("room");
        assertThat(coupling.to().name()).isEqualTo("cellar");
    }

    @Test
    void theAsksOfTransmittanceFactorAndDifference() {
        Ask.Transmittance psi = (Ask.Transmittance) subject.asks().get(7);
        assertThat(psi.less()).hasSize(2);
        assertThat(psi.less().get(0).u().path()).isEqualTo("ask.psi.less.1.u");
        assertThat(psi.less().get(1).length().path()).isEqualTo("ask.psi.less.2.length");
        assertThat(psi.less().get(1).length().quantity().value()).isCloseTo(0.4, EXACT);
        Ask.Factor factor = (Ask.Factor) subject.asks().get(8);
        assertThat(factor.edge()).isSameAs(edge("lid"));
        assertThat(factor.inner().name()).isEqualTo("room");
        assertThat(factor.outer().name()).isEqualTo("cellar");
        assertThat(factor.head().limit().quantity().value()).isCloseTo(0.7, EXACT);
        assertThat(factor.head().within()).isEqualTo(new Within.Absolute(0.005));
        Ask.Difference drop = (Ask.Difference) subject.asks().get(9);
        assertThat(drop.first()).isSameAs(subject.asks().get(0));
        assertThat(drop.second()).isSameAs(subject.asks().get(1));
        assertThat(drop.head().limit().quantity().value()).isCloseTo(30, EXACT);
    }

    @Test
    void theMesh() {
        MeshRequest mesh = subject.mesh();
        assertThat(mesh.nodesPerTriangle()).isEqualTo(3);
        assertThat(mesh.smallestAngle()).isCloseTo(Math.toRadians(25), EXACT);
        assertThat(mesh.size()).isCloseTo(0.015, EXACT);
        assertThat(mesh.trianglesAtMost()).isEqualTo(50000);
        List<Refinement> refinements = mesh.refinements();
        assertThat(refinements).extracting(Refinement::size).containsExactly(0.001, 0.002, 0.0005, 0.003);
        assertThat(refinements.get(0).near())
                .isEqualTo(new Target.OfRegion(subject.regions().get(1)));
        assertThat(refinements.get(1).near()).isEqualTo(new Target.OfEdge(edge("lid")));
        assertThat(refinements.get(2).geometry().getCoordinate().x).isCloseTo(0.07, EXACT);
        assertThat(refinements.get(3).near()).isNull();
        assertThat(refinements.get(3).geometry().getArea()).isCloseTo(400e-6, EXACT);
    }

    @Test
    void theInputsAndTheOneWarningOfTheirSpreads() {
        assertThat(subject.inputs().all())
                .extracting(Input::path)
                .containsExactly(
                        "depth",
                        "material.resin.k",
                        "material.resin.density",
                        "material.resin.heat_capacity",
                        "material.copper.k",
                        "material.\"v1.2 wood\".k.along",
                        "material.\"v1.2 wood\".k.across",
                        "material.\"v1.2 wood\".k.angle",
                        "region.bars.heat",
                        "region.shim.heat",
                        "region.wire.heat",
                        "air.room.temperature",
                        "air.room.film",
                        "air.cellar.temperature",
                        "edge.sole.resistance",
                        "edge.sole.inflow",
                        "edge.flank.film",
                        "edge.flank.air",
                        "edge.duct.temperature",
                        "edge.outside.inflow",
                        "ask.psi.less.1.u",
                        "ask.psi.less.1.length",
                        "ask.psi.less.2.u",
                        "ask.psi.less.2.length");
        assertThat(subject.warnings()).hasSize(1);
        Finding warning = subject.warnings().get(0);
        assertThat(warning.code()).isEqualTo("spreads-not-counted");
        assertThat(warning.what()).contains("5 inputs", "material.resin.k");
    }

    @Test
    void whatIsLeftOutHasItsDefault() {
        Case plain = new CaseFolder(folder).read(CaseFolder.sound("title = \"Plate\"\n", ""));
        assertThat(plain.name()).isEqualTo("plate");
        assertThat(plain.title()).isEqualTo("plate");
        assertThat(plain.depth()).isNull();
        assertThat(plain.reportFields()).isEmpty();
        assertThat(plain.mesh().nodesPerTriangle()).isEqualTo(6);
        assertThat(plain.mesh().smallestAngle()).isCloseTo(Math.toRadians(28), EXACT);
        assertThat(plain.mesh().size()).isInfinite();
        assertThat(plain.mesh().refinements()).isEmpty();
        assertThat(plain.mesh().trianglesAtMost()).isEqualTo(2_000_000);
        assertThat(plain.accuracy().adapt()).isTrue();
        assertThat(plain.accuracy().confidence()).isCloseTo(0.95, EXACT);
        assertThat(plain.warnings()).isEmpty();
        // 1e-7 of the diagonal of 100 by 50 mm
        assertThat(plain.section().snap()).isCloseTo(1e-7 * Math.hypot(0.1, 0.05), within(1e-15));
    }
}
