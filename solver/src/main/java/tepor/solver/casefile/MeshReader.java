package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.WktReader;
import tepor.mesher.section.RegionShape;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.Names.Kind;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.casefile.TargetReader.Parts;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.MeshRequest.Refinement;
import tepor.solver.model.Target;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;

/** Reads {@code [mesh]}. */
final class MeshReader {
    private static final Keys MESH = Keys.of("element", "angle", "size", "refine", "elements_at_most");
    private static final Keys REFINE = Keys.of("near", "size");
    private static final double ANGLE = Math.toRadians(28);
    /** Above this, refinement of a Delaunay triangulation no longer ends reliably. */
    private static final double LARGEST_ANGLE = Math.toRadians(33);

    private static final int ELEMENTS = 2_000_000;
    private static final long FEWEST_ELEMENTS = 100;
    private static final long MOST_ELEMENTS = 100_000_000;
    private static final String NO_SPREAD = "a mesh is made to one value";
    private static final Pattern WKT = Pattern.compile("\\s*[A-Za-z]+(\\s+[ZMzm]{1,2})?\\s*\\(.*", Pattern.DOTALL);

    private final Parts parts;
    private final Map<String, RegionShape> shapes;
    private final Drawing drawing;
    private final QuantityKeys quantities;
    private final Findings findings;

    MeshReader(
            Parts parts, Map<String, RegionShape> shapes, Drawing drawing, QuantityKeys quantities, Findings findings) {
        this.parts = parts;
        this.shapes = shapes;
        this.drawing = drawing;
        this.quantities = quantities;
        this.findings = findings;
    }

    MeshRequest read(KeyTable root) {
        Optional<KeyTable> table = root.table("mesh");
        table.ifPresent(t -> t.allow(MESH));
        int nodes = table.flatMap(t -> t.value("element")).map(this::nodes).orElse(6);
        double angle = table.flatMap(t -> t.value("angle")).map(this::angle).orElse(ANGLE);
        double size = table.flatMap(t -> t.value("size")).map(this::size).orElse(Double.POSITIVE_INFINITY);
        int elements = table.flatMap(t -> t.integer("elements_at_most", "elements_at_most = 2000000")
                        .map(n -> elements(t, n)))
                .orElse(ELEMENTS);
        List<Refinement> refinements = new ArrayList<>();
        String example = "refine = [{ near = \"bars\", size = \"1 mm\" }]";
        for (Value element : table.flatMap(t -> t.value("refine"))
                .map(v -> v.elements(example))
                .orElse(List.of())) {
            element.table(example, element.name()).flatMap(this::refinement).ifPresent(refinements::add);
        }
        return new MeshRequest(nodes, angle, size, refinements, elements);
    }

    private int nodes(Value value) {
        String element = value.text().orElse("quadratic");
        if (!element.equals("quadratic") && !element.equals("linear")) {
            findings.error(
                    "unknown-word",
                    value.place(),
                    value.name() + " is " + value.found(),
                    "write \"quadratic\" or \"linear\"");
        }
        return element.equals("linear") ? 3 : 6;
    }

    private double angle(Value value) {
        Optional<Double> angle =
                quantities.exact(value, NO_SPREAD, Range.ANY, Dimension.ANGLE).map(Quantity::value);
        // The limit itself must pass although its conversion to radians is rounded.
        if (angle.isPresent() && !(angle.get() >= 0 && angle.get() <= LARGEST_ANGLE * (1 + 1e-12))) {
            findings.error(
                    "out-of-range",
                    value.place(),
                    value.name() + " is " + value.found() + ", but must lie between 0 deg and 33 deg",
                    angle.get() < 0
                            ? "write angle = \"28 deg\", or leave it out"
                            : "write a smaller angle; above 33 deg refinement adds points without an end");
        }
        return angle.orElse(ANGLE);
    }

    private double size(Value value) {
        return quantities
                .exact(value, NO_SPREAD, Range.POSITIVE, Dimension.LENGTH)
                .map(Quantity::value)
                .orElse(Double.POSITIVE_INFINITY);
    }

    private int elements(KeyTable mesh, long number) {
        if (number < FEWEST_ELEMENTS || number > MOST_ELEMENTS) {
            findings.error(
                    "out-of-range",
                    mesh.place("elements_at_most"),
                    "'elements_at_most' of [mesh] is " + number + ", but must lie between " + FEWEST_ELEMENTS + " and "
                            + MOST_ELEMENTS,
                    "write a number in between, or leave it out for " + ELEMENTS);
            return ELEMENTS;
        }
        return (int) number;
    }

    private Optional<Refinement> refinement(KeyTable table) {
        table.allow(REFINE);
        if (!table.has("near")) {
            table.missing("near", "near = \"…\": a region, an edge, or a geometry in WKT");
        }
        if (!table.has("size")) {
            table.missing("size", "size = \"1 mm\"");
        }
        Optional<Double> size = table.value("size")
                .flatMap(v -> quantities.exact(v, NO_SPREAD, Range.POSITIVE, Dimension.LENGTH))
                .map(Quantity::value);
        Optional<Value> near = table.value("near");
        Optional<Refinement> place = near.flatMap(Value::text).flatMap(text -> near(near.get(), text));
        return size.isEmpty() ? Optional.empty() : place.map(p -> new Refinement(p.near(), p.geometry(), size.get()));
    }

    /** Where to refine, its size left open. */
    private Optional<Refinement> near(Value value, String text) {
        Optional<Kind> kind = parts.names().kindOf(text);
        if (kind.isEmpty() && WKT.matcher(text).matches()) {
            Optional<Geometry> geometry = WktReader.readGeometry(text, value.place(), drawing.unit(), findings);
            return geometry.map(g -> new Refinement(null, g, 0));
        }
        if (!parts.names().check(text, value.place(), value.name(), "", Kind.REGION, Kind.EDGE)) {
            return Optional.empty();
        }
        if (kind.get() == Kind.EDGE) {
            return Optional.ofNullable(parts.edges().get(text)).map(e -> new Refinement(new Target.OfEdge(e), null, 0));
        }
        if (parts.holes().contains(text)) {
            // A hole has no elements of its own: what is meant are those around it.
            return Optional.ofNullable(shapes.get(text)).map(s -> new Refinement(null, s.polygons(), 0));
        }
        return Optional.ofNullable(parts.regions().get(text)).map(r -> new Refinement(new Target.OfRegion(r), null, 0));
    }
}
