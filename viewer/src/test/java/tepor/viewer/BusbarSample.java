package tepor.viewer;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.mesh.MeshQuality;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Place;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.section.EdgePieces;
import tepor.mesher.section.Section;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.HandCheck;
import tepor.solver.answer.Inspection;
import tepor.solver.answer.Insulated;
import tepor.solver.answer.Ledger;
import tepor.solver.answer.MeshError;
import tepor.solver.answer.Verdict;
import tepor.solver.model.Accuracy;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.HeatSource;
import tepor.solver.model.Input;
import tepor.solver.model.Inputs;
import tepor.solver.model.Limit;
import tepor.solver.model.Material;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.Region;
import tepor.solver.model.SourceFile;
import tepor.solver.model.Target;
import tepor.solver.model.Within;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;
import tepor.solver.quantity.Spread;
import tepor.viewer.picture.PatternedGrid;

/**
 * A case and its answer made by hand: a bar in resin, 200 mm by 120 mm, cooled at the top, insulated elsewhere. The figures
 * are invented; they need not solve anything.
 */
public final class BusbarSample {
    public static final String FIRST_DIGEST = "0123456789abcdef0123456789abcdef0123456789abcdef0123456789abcdef";
    public static final String SECOND_DIGEST = "fedcba9876543210fedcba9876543210fedcba9876543210fedcba9876543210";
    private static final Place PLACE = new Place("case.toml", 12, 3);

    private final PatternedGrid grid = PatternedGrid.rectangle(
            0.2, 0.12, 10, 6, (i, j) -> i >= 4 && i < 6 && j >= 2 && j < 4 ? 1 : 0, "resin", "bars");
    private final Section section = grid.section();
    private final Inputs inputs = new Inputs();
    private String name = "busbar-duct";
    private String title = "Busbar duct in a pump house";
    private Verdict verdict = Verdict.MET;
    private double error = 0.05;
    private double imbalance = 3.1e-13;
    private boolean withDepth = true;

    public BusbarSample name(String other) {
        name = other;
        return this;
    }

    public BusbarSample title(String other) {
        title = other;
        return this;
    }

    /** Verdict on the hottest bar's limit; null takes the limit away. */
    public BusbarSample verdict(Verdict other) {
        verdict = other;
        return this;
    }

    /** Half-width of the mesh error of every answer. */
    public BusbarSample error(double other) {
        error = other;
        return this;
    }

    public BusbarSample imbalance(double other) {
        imbalance = other;
        return this;
    }

    public BusbarSample withoutDepth() {
        withDepth = false;
        return this;
    }

    private Input input(String path, double value, Dimension dimension, String unit, Spread spread, String text) {
        return inputs.find(path)
                .orElseGet(() -> inputs.add(path, new Quantity(value, dimension, unit, spread, text), PLACE));
    }

    public Case subject() {
        Input depth = input("depth", 2.5, Dimension.LENGTH, "m", null, "2.5 m");
        Input film = input(
                "air.room.film",
                8,
                Dimension.FILM,
                "W/(m2.K)",
                new Spread(Spread.Distribution.RECTANGULAR, 1.6, 1),
                "8 W/(m2.K) ± 20 %");
        Input outside = input(
                "air.room.temperature",
                308.15,
                Dimension.TEMPERATURE,
                "degC",
                new Spread(Spread.Distribution.NORMAL, 3, 2),
                "35 ± 3 degC (normal, k=2)");
        Air room = new Air("room", outside, film, PLACE);
        Material resin = material("resin", 0.65, "supplier's data sheet, nominal");
        Material copper = material("copper", 380, "");
        HeatSource heat = new HeatSource(
                input("region.bars.heat", 42, Dimension.HEAT_PER_LENGTH, "W/m", null, "42 W/m"),
                HeatSource.Basis.PER_LENGTH);
        List<Region> regions =
                List.of(new Region("resin", 0, resin, null, PLACE), new Region("bars", 1, copper, heat, PLACE));
        Edge top = new Edge("outer skin", top(), List.of(new EdgeCondition.Film(film, outside, room)), "", PLACE);
        Map<String, String> fields = new LinkedHashMap<>();
        fields.put("project", "Pump house 3");
        fields.put("prepared", "A. Nobody");
        Asks asks = new Asks(regions, top);
        return new Case(
                name,
                title,
                withDepth ? depth : null,
                fields,
                section,
                new DrawingUnit("mm", 1e-3),
                regions,
                List.of(resin, copper),
                List.of(room),
                List.of(top),
                List.of(asks.peak(), asks.flow()),
                new MeshRequest(6, 0.48, Double.POSITIVE_INFINITY, List.of(), 2_000_000),
                new Accuracy(true, 0.95),
                inputs,
                List.of(warning()),
                List.of(new SourceFile("case.toml", FIRST_DIGEST), new SourceFile("duct.wkt", SECOND_DIGEST)));
    }

    private Material material(String materialName, double k, String source) {
        String path = "material." + materialName + ".k";
        Input conductivity = input(path, k, Dimension.CONDUCTIVITY, "W/(m.K)", null, k + " W/(m.K)");
        return new Material(materialName, new Conductivity.Uniform(conductivity), null, null, source, PLACE);
    }

    private final class Asks {
        private final List<Region> regions;
        private final Edge edge;

        Asks(List<Region> regions, Edge edge) {
            this.regions = regions;
            this.edge = edge;
        }

        Ask peak() {
            Limit limit = verdict == null
                    ? null
                    : new Limit(
                            Limit.Relation.AT_MOST,
                            new Quantity(105 + 273.15, Dimension.TEMPERATURE, "degC", null, "105 degC"));
            return new Ask.Peak(head("hottest bar", limit), new Target.OfRegion(regions.get(1)));
        }

        Ask flow() {
            return new Ask.Flow(head("heat to the room", null), new Target.OfEdge(edge));
        }

        private Ask.Head head(String askName, Limit limit) {
            return new Ask.Head(askName, limit, new Within.Absolute(0.2), Map.of(), PLACE);
        }
    }

    public static Finding warning() {
        return new Finding(
                Finding.Severity.WARNING, "spreads-not-counted", PLACE, "2 inputs state a spread <b>", "nothing to do");
    }

    /** Boundary segments on the top side. */
    private EdgePieces top() {
        int[] top = segments(true);
        int[] signs = new int[top.length];
        for (int i = 0; i < top.length; i++) {
            signs[i] = section.solidLeft(top[i]) ? 1 : -1;
        }
        return new EdgePieces(top, signs);
    }

    private int[] segments(boolean wantTop) {
        List<Integer> found = new ArrayList<>();
        for (int s = 0; s < section.segmentCount(); s++) {
            boolean isTop = section.y(section.start(s)) > 0.1199 && section.y(section.end(s)) > 0.1199;
            if (section.isBoundary(s) && isTop == wantTop) {
                found.add(s);
            }
        }
        return found.stream().mapToInt(i -> i).toArray();
    }

    private MeshResult mesh() {
        return new MeshResult(
                grid.mesh(6),
                new MeshQuality(Math.toRadians(27), Math.toRadians(30), Math.toRadians(120)),
                new RefinementReport(
                        List.of(new RefinementReport.Stop(RefinementReport.Reason.IMPOSED_BY_OUTLINE, 0.01, 0.01))));
    }

    private Insulated insulated() {
        return new Insulated(0, 0.44, List.of(segments(false)));
    }

    public Answer answer() {
        Case subject = subject();
        MeshResult mesh = mesh();
        MeshError meshError = new MeshError(-error, error, MeshError.Kind.ESTIMATE, 0.2, error <= 0.2);
        AskAnswer peak = new AskAnswer(
                subject.asks().get(0),
                96.37 + 273.15,
                Dimension.TEMPERATURE,
                "degC",
                new double[] {0.1, 0.06},
                meshError,
                verdict,
                null);
        AskAnswer flow = new AskAnswer(
                subject.asks().get(1),
                42,
                Dimension.HEAT_PER_LENGTH,
                "W/m",
                null,
                meshError,
                null,
                new HandCheck(40, 43.5, true, List.of("R = 0.12 m / 0.65 W/(m.K) = 0.185 m2.K/W", "flow < 43.5 W/m")));
        return new Answer(
                subject,
                mesh,
                PatternedGrid.field(mesh.mesh(), (x, y) -> 40 + 400 * (0.12 - y)),
                List.of(peak, flow),
                new Ledger(
                        List.of(
                                new Ledger.Row("bars", "heat", 42, false),
                                new Ledger.Row("outer skin", "film", -42, false)),
                        imbalance),
                insulated(),
                List.of(
                        new Answer.Round(1, 60, List.of(95.9 + 273.15, 42.0), java.util.Arrays.asList(null, null)),
                        new Answer.Round(2, 120, List.of(96.37 + 273.15, 42.0), List.of(meshError, meshError))),
                new Answer.Figures(150, 14, 1e-12, 0.04, 0.02, 0.05, 0.31),
                List.of(warning()));
    }

    public Inspection inspection() {
        return new Inspection(subject(), mesh(), 0.04, insulated(), List.of(warning()));
    }
}
