package tepor.viewer.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleBiFunction;
import tepor.mesher.mesh.MeshQuality;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Place;
import tepor.mesher.section.EdgePieces;
import tepor.mesher.section.Section;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.Inspection;
import tepor.solver.answer.Insulated;
import tepor.solver.answer.Ledger;
import tepor.solver.answer.MeshError;
import tepor.solver.answer.Verdict;
import tepor.solver.field.TemperatureField;
import tepor.solver.model.Accuracy;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Inputs;
import tepor.solver.model.Limit;
import tepor.solver.model.Material;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.Region;
import tepor.solver.model.Target;
import tepor.solver.model.Within;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;

/** Answers for tests of pictures: a patterned grid, a temperature given as a formula, asks as they come. */
public final class SampleAnswers {
    private static final Place PLACE = new Place("case.toml", 1, 1);

    private final PatternedGrid grid;
    private final Section section;
    private final Inputs inputs = new Inputs();
    private final List<Region> regions = new ArrayList<>();
    private final List<Edge> edges = new ArrayList<>();
    private final List<AskAnswer> asks = new ArrayList<>();
    private final List<int[]> insulated = new ArrayList<>();
    private final String title;
    private DrawingUnit unit = new DrawingUnit("mm", 1e-3);
    private double byDefault;

    public SampleAnswers(String title, PatternedGrid grid) {
        this.title = title;
        this.grid = grid;
        section = grid.section();
        for (int r = 0; r < section.regionCount(); r++) {
            regions.add(new Region(section.regionName(r), r, section.isHole(r) ? null : material(r), null, PLACE));
        }
    }

    private Material material(int r) {
        double k = 0.1 * Math.pow(4, r);
        Conductivity conductivity = r == 1
                ? new Conductivity.Directional(
                        input("material.m1.k.along", k, Dimension.CONDUCTIVITY),
                        input("material.m1.k.across", 0.25 * k, Dimension.CONDUCTIVITY),
                        input("material.m1.k.angle", Math.PI / 6, Dimension.ANGLE))
                : new Conductivity.Uniform(input("material.m" + r + ".k", k, Dimension.CONDUCTIVITY));
        return new Material("material " + r, conductivity, null, null, "", PLACE);
    }

    private tepor.solver.model.Input input(String path, double value, Dimension dimension) {
        return inputs.add(path, quantity(value, dimension, dimension.unit()), PLACE);
    }

    private static Quantity quantity(double value, Dimension dimension, String unit) {
        return new Quantity(
                value, dimension, unit, null, FigureText.significant(value, 4) + (unit.isEmpty() ? "" : " " + unit));
    }

    public Section section() {
        return section;
    }

    public SampleAnswers unit(DrawingUnit other) {
        unit = other;
        return this;
    }

    /** An ask of a highest temperature (°C) at a place, with a limit unless that is not a number. */
    public SampleAnswers peak(
            String name, double celsius, double error, double limit, Verdict verdict, double... where) {
        Limit l = Double.isNaN(limit)
                ? null
                : new Limit(Limit.Relation.AT_MOST, quantity(limit + 273.15, Dimension.TEMPERATURE, "degC"));
        return ask(new Ask.Peak(head(name, l), new Target.Everything()), celsius, error, verdict, where);
    }

    public SampleAnswers lowest(String name, double celsius, double error, double... where) {
        return ask(new Ask.Lowest(head(name, null), new Target.Everything()), celsius, error, null, where);
    }

    public SampleAnswers at(String name, double celsius, double error, double... where) {
        return ask(new Ask.At(head(name, null), where[0], where[1]), celsius, error, null, where);
    }

    /** An ask of a heat flow, W/m. */
    public SampleAnswers flow(String name, double value, double error) {
        asks.add(new AskAnswer(
                new Ask.Flow(head(name, null), new Target.Everything()),
                value,
                Dimension.HEAT_PER_LENGTH,
                "W/m",
                null,
                new MeshError(-error, error, MeshError.Kind.ESTIMATE, 1, true),
                null,
                null));
        return this;
    }

    private SampleAnswers ask(Ask ask, double celsius, double error, Verdict verdict, double... where) {
        asks.add(new AskAnswer(
                ask,
                celsius + 273.15,
                Dimension.TEMPERATURE,
                "degC",
                where,
                new MeshError(-error, error, MeshError.Kind.ESTIMATE, 1, true),
                verdict,
                null));
        return this;
    }

    private static Ask.Head head(String name, Limit limit) {
        return new Ask.Head(name, limit, new Within.Fraction(0.01), Map.of(), PLACE);
    }

    /** Boundary segments whose middle is chosen are insulated by default. */
    public SampleAnswers insulated(Chosen chosen) {
        int[] pieces = find(chosen);
        insulated.add(pieces);
        for (int s : pieces) {
            byDefault += section.length(s);
        }
        return this;
    }

    /** A named edge on boundary segments whose middle is chosen. */
    public SampleAnswers edge(String name, Chosen chosen) {
        int[] pieces = find(chosen);
        int[] signs = new int[pieces.length];
        java.util.Arrays.fill(signs, 1);
        Air air = new Air(
                name + " air", input("air." + name + ".temperature", 293.15, Dimension.TEMPERATURE), null, PLACE);
        EdgeCondition film =
                new EdgeCondition.Film(input("edge." + name + ".film", 8, Dimension.FILM), air.temperature(), air);
        edges.add(new Edge(name, new EdgePieces(pieces, signs), List.of(film), "", PLACE));
        return this;
    }

    /** Chooses by the middle of a segment, metres. */
    @FunctionalInterface
    public interface Chosen {
        boolean at(double x, double y);
    }

    private int[] find(Chosen chosen) {
        return java.util.stream.IntStream.range(0, section.segmentCount())
                .filter(section::isBoundary)
                .filter(s -> chosen.at(
                        0.5 * (section.x(section.start(s)) + section.x(section.end(s))),
                        0.5 * (section.y(section.start(s)) + section.y(section.end(s)))))
                .toArray();
    }

    private Case subject() {
        return new Case(
                "sample",
                title,
                null,
                Map.of(),
                section,
                unit,
                regions,
                List.of(),
                List.of(),
                edges,
                asks.stream().map(AskAnswer::ask).toList(),
                new MeshRequest(6, 0.48, Double.POSITIVE_INFINITY, List.of(), 2_000_000),
                new Accuracy(true, 0.95),
                inputs,
                List.of(),
                List.of());
    }

    /** The answer whose temperature (°C) has these values at the nodes. */
    public Answer answer(int nodesPerTriangle, ToDoubleBiFunction<Double, Double> celsius) {
        TemperatureField field = PatternedGrid.field(grid.mesh(nodesPerTriangle), celsius);
        return new Answer(
                subject(),
                mesh(field.mesh()),
                field,
                asks,
                new Ledger(List.of(), 0),
                new Insulated(0, byDefault, insulated),
                List.of(),
                new Answer.Figures(0, 0, 0, 0, 0, 0, 0),
                List.of());
    }

    public Inspection inspection() {
        return new Inspection(subject(), mesh(grid.mesh(6)), 0, new Insulated(0, byDefault, insulated), List.of());
    }

    private static MeshResult mesh(tepor.mesher.mesh.Mesh mesh) {
        return new MeshResult(mesh, new MeshQuality(0.5, 0.5, 2), null);
    }
}
