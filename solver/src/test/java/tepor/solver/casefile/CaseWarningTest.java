package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.outline.Finding;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.EdgeCondition.Film;
import tepor.solver.model.EdgeCondition.SurfaceResistance;
import tepor.solver.model.Target;

/** What goes along with an answer: warnings, and things that look odd but are right. */
class CaseWarningTest {
    @TempDir
    Path temp;

    private CaseFolder folder;

    @BeforeEach
    void make() {
        folder = new CaseFolder(temp);
    }

    private Finding warning(String old, String replacement) {
        List<Finding> warnings = folder.warnings(CaseFolder.sound(old, replacement));
        assertThat(warnings).hasSize(1);
        return warnings.get(0);
    }

    @Test
    void aMaterialThatNoRegionUses() {
        Finding found = warning("[material.copper]", "«[material.brass]\nk = \"100 W/(m.K)\"\n[material.copper]");
        assertThat(found.what()).contains("no region is of material 'brass'");
    }

    @Test
    void anAirThatNoEdgeIsIn() {
        Finding found = warning("[air.cellar]", "«[air.attic]\ntemperature = \"3 degC\"\n[air.cellar]");
        assertThat(found.what()).contains("no edge is in air 'attic'");
    }

    @Test
    void aCaseThatAsksNothing() {
        String toml = CaseFolder.SOUND.substring(0, CaseFolder.SOUND.indexOf("[[ask]]"));
        assertThat(folder.warnings("«" + toml).get(0).what()).contains("asks nothing");
    }

    @Test
    void filmAndResistanceSideBySide() {
        String toml = CaseFolder.sound("resistance =", "film = \"3 W/(m2.K)\"\n«resistance =");
        assertThat(folder.warnings(toml).get(0).what()).contains("edge 'sole'", "side by side");
        Case subject = folder.read(toml.replace("«", ""));
        assertThat(subject.edges().get(1).conditions()).hasExactlyElementsOfTypes(Film.class, SurfaceResistance.class);
    }

    @Test
    void aPointJustOffTheSectionMovesOntoIt() {
        String toml = CaseFolder.sound("peak = \"bar\"", "«at = \"POINT (100.001 10)\"");
        Finding found = folder.warnings(toml).get(0);
        assertThat(found.what()).contains("0.001 mm", "moved to (100 10) mm");
        Ask.At at = (Ask.At) folder.read(toml.replace("«", "")).asks().get(0);
        assertThat(at.x()).isCloseTo(0.1, within(1e-15));
        assertThat(at.y()).isCloseTo(0.01, within(1e-15));
    }

    @Test
    void pointsOnBordersAndCornersAreOnTheSection() {
        for (String point :
                List.of("100 50", "0 0", "50 50", "20 10", "60 20", "0 25", "50 10", "10 30", "30 20", "21 11")) {
            assertThat(folder.warnings(CaseFolder.sound("peak = \"bar\"", "at = \"POINT (" + point + ")\"")))
                    .as(point)
                    .isEmpty();
        }
    }

    @Test
    void aFlowThroughAnEdgeOnWhichNothingHolds() {
        String edge = "[[edge]]\nname = \"flank\"\nwhere = \"left\"\n";
        List<Finding> warnings =
                folder.warnings(CaseFolder.SOUND.replace("peak = \"bar\"", "«flow = \"flank\"") + edge);
        assertThat(warnings.get(0).what()).contains("edge 'flank'", "heat flow is 0");
    }

    @Test
    void aFlowThroughAnInterfaceOrANameOverAConditionIsRight() {
        assertThat(folder.warnings(CaseFolder.sound("peak = \"bar\"", "flow = \"bar skin\"")))
                .isEmpty();
        String edge = "[[edge]]\nname = \"all\"\nwhere = \"outside\"\n";
        assertThat(folder.warnings(CaseFolder.SOUND.replace("peak = \"bar\"", "flow = \"all\"") + edge))
                .isEmpty();
    }

    @Test
    void aTransmittanceThatLeavesOutNothing() {
        String marked = CaseFolder.sound(
                "[[ask]]\nname = \"hot\"\npeak = \"bar\"",
                "«[[ask]]\nname = \"psi\"\ntransmittance = [\"room\", \"cellar\"]");
        assertThat(folder.warnings(marked).get(0).what()).contains("ask 'psi'", "coupling itself");
        assertThat(folder.warnings(marked.replace("«", "") + "less = []\n")).isEmpty();
    }

    @Test
    void aPartOfAWhereThatFindsNothing() {
        Finding found = warning("where = \"top\"", "«where = [\"top\", { line = \"LINESTRING (0 70, 100 70)\" }]");
        assertThat(found.what()).contains("part 2", "edge 'skin'", "20 mm away");
    }

    @Test
    void aNameMayBeAnyText() {
        String toml = CaseFolder.SOUND
                .replace("\"skin\"", "\"outside\"")
                .replace("\"plate\"", "\"everything\"")
                .replace("\"bar skin\"", "\"POINT (1 1)\"")
                .replace("air.cellar", "air.\"3 degC\"")
                .replace("air = \"cellar\"", "air = \"3 degC\"");
        Case subject = folder.read(toml.replace("peak = \"bar\"", "peak = \"everything\"") + """
                [[ask]]
                name = "out"
                flow = "outside"
                [mesh]
                refine = [{ near = "POINT (1 1)", size = "1 mm" }]
                """);
        assertThat(subject.warnings()).isEmpty();
        Ask.Peak peak = (Ask.Peak) subject.asks().get(0);
        assertThat(peak.target())
                .isEqualTo(new Target.OfRegion(subject.regions().get(0)));
        assertThat(((Ask.Flow) subject.asks().get(1)).target().name()).isEqualTo("outside");
        assertThat(subject.mesh().refinements().get(0).near().name()).isEqualTo("POINT (1 1)");
        SurfaceResistance sole =
                (SurfaceResistance) subject.edges().get(1).conditions().get(0);
        assertThat(sole.air().name()).isEqualTo("3 degC");
        assertThat(sole.airTemperature().quantity().value()).isCloseTo(283.15, within(1e-9));
    }

    @Test
    void aPathMayLeaveItsQuotesOut() {
        String toml = CaseFolder.SOUND.replace("copper", "\"cu 1.2\"").replace("\"\"", "\"")
                + "with = { %s = \"300 W/(m.K)\" }\n";
        for (String path : List.of("'material.\"cu 1.2\".k'", "'material.cu 1.2.k'", "material.\"cu 1.2\".k")) {
            Case subject = folder.read(toml.formatted(path));
            assertThat(subject.asks().get(0).head().with())
                    .containsOnlyKeys(
                            subject.inputs().find("material.\"cu 1.2\".k").orElseThrow());
        }
    }

    @Test
    void oneWarningForAllSpreads() {
        String marked = CaseFolder.SOUND
                .replace("k = \"15 W/(m.K)\"", "«k = \"15 W/(m.K) ± 10 %\"")
                .replace("\"8 W/(m2.K)\"", "\"8 ± 2 W/(m2.K)\"");
        List<Finding> warnings = folder.warnings(marked);
        assertThat(warnings.get(0).code()).isEqualTo("spreads-not-counted");
        assertThat(warnings.get(0).what()).contains("2 inputs", "material.steel.k");
    }

    @Test
    void anEdgeThatOnlyNamesMayLieOverOthers() {
        String edge = "[[edge]]\nname = \"roof\"\nwhere = [\"top\", \"rest\"]\n";
        Case subject = folder.read(CaseFolder.SOUND + edge);
        // 100 mm of top, two sides of 50 mm, and the border of the void: four sides of 20 mm
        assertThat(subject.edges().get(3).pieces().length(subject.section())).isCloseTo(0.28, within(1e-12));
    }

    @Test
    void theEdgesOwnFilmGoesBeforeThatOfItsAir() {
        Case subject = folder.read(CaseFolder.sound("air = \"room\"", "air = \"room\"\nresistance = \"0.1 m2.K/W\""));
        assertThat(subject.edges().get(0).conditions()).hasExactlyElementsOfTypes(SurfaceResistance.class);
    }
}
