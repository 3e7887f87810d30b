package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.outline.OutlineElement.Kind;
import tepor.mesher.section.OutlineCheck;
import tepor.mesher.section.Where;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;

/** Reads the {@code where} of an edge. */
final class WhereReader {
    private static final Keys FORMS = Keys.of("line", "layer", "cut", "inside", "nearest", "of", "between");
    private static final Map<String, Where> WORDS = Map.of(
            "left", new Where.OnSide(Where.Side.LEFT),
            "right", new Where.OnSide(Where.Side.RIGHT),
            "bottom", new Where.OnSide(Where.Side.BOTTOM),
            "top", new Where.OnSide(Where.Side.TOP),
            "outside", new Where.Outside(),
            "holes", new Where.Holes(),
            "rest", new Where.Rest());
    private static final List<String> WORDS_IN_ORDER =
            List.of("left", "right", "bottom", "top", "outside", "holes", "rest");
    private static final String EXAMPLE = "where = \"outside\", or another word or form of the reference";

    private static final String CHECKED = "inside";

    private final Names names;
    private final Drawing drawing;
    private final RecordUse recordUse;
    private final List<String> regions;
    private final List<Coordinate> splitPoints = new ArrayList<>();
    private final List<LineString> cuts = new ArrayList<>();

    /**
     * @param names the names of the case
     * @param drawing for coordinates, and lines that are drawn
     * @param recordUse takes which records of the drawing are used
     * @param regions the names of the regions by their number in the section
     */
    WhereReader(Names names, Drawing drawing, RecordUse recordUse, List<String> regions) {
        this.names = names;
        this.drawing = drawing;
        this.recordUse = recordUse;
        this.regions = regions;
    }

    /** The vertices of all lines read so far: where a line ends or turns away, the piece below it is split. */
    List<Coordinate> splitPoints() {
        return List.copyOf(splitPoints);
    }

    /** The cuts read so far. */
    List<LineString> cuts() {
        return List.copyOf(cuts);
    }

    /** Where the edge in a table is; empty, with errors, where that is missing or wrong. */
    Optional<Where> read(KeyTable edge) {
        Optional<Value> value = edge.value("where");
        if (value.isEmpty()) {
            edge.missing("where", EXAMPLE);
            return Optional.empty();
        }
        if (!value.get().isArray()) {
            return one(value.get());
        }
        List<Value> elements = value.get().elements(EXAMPLE);
        if (elements.isEmpty()) {
            edge.findings()
                    .error("empty-where", value.get().place(), value.get().name() + " is empty", "write " + EXAMPLE);
            return Optional.empty();
        }
        List<Where> parts = new ArrayList<>();
        for (Value element : elements) {
            one(element).ifPresent(parts::add);
        }
        return parts.size() < elements.size() ? Optional.empty() : Optional.of(new Where.Union(parts));
    }

    private Optional<Where> one(Value value) {
        if (value.isText()) {
            return word(value, (String) value.raw());
        }
        if (!value.isTable()) {
            value.wrongType("a word or a table", "write " + EXAMPLE);
            return Optional.empty();
        }
        KeyTable table = value.table("where", value.name()).orElseThrow();
        table.allow(FORMS);
        if (!FORMS.now().containsAll(table.keys())) {
            return Optional.empty();
        }
        if (table.keys().size() != 1) {
            value.findings()
                    .error(
                            "where-form",
                            value.place(),
                            value.name() + " has " + table.keys().size() + " keys, where exactly one is wanted",
                            "write one of line, layer, cut, inside, nearest, of, between; a union is an array of such tables");
            return Optional.empty();
        }
        String key = table.keys().iterator().next();
        Value form = table.value(key).orElseThrow();
        return switch (key) {
            case "line" -> line(form);
            case "layer" -> layer(form);
            case "cut" -> cut(form);
            case "inside" -> inside(form);
            case "nearest" ->
                drawing.geometry(form, "a point", "POINT")
                        .map(p -> new Where.Nearest(p.getCoordinate().x, p.getCoordinate().y));
            case "of" -> region(form).map(Where.OfRegion::new);
            default -> between(form);
        };
    }

    private Optional<Where> word(Value value, String word) {
        Where where = WORDS.get(word);
        if (where != null) {
            return Optional.of(where);
        }
        Optional<Names.Kind> kind = names.kindOf(word);
        String words = "the words are " + String.join(", ", WORDS_IN_ORDER);
        String remedy = kind.isPresent()
                ? words
                : NearestWord.to(word, WORDS_IN_ORDER)
                        .map(near -> "did you mean \"" + near + "\"")
                        .orElse(words);
        if (kind.isPresent() && kind.get() == Names.Kind.REGION) {
            remedy = "write { of = \"" + word + "\" } for the border of the region, or { between = [\"" + word
                    + "\", \"…\"] } for where it meets another";
        }
        value.findings()
                .error(
                        "unknown-word",
                        value.place(),
                        value.name() + " is \"" + word + "\", which is no word for a place"
                                + kind.map(k -> " but the name of " + k.words()).orElse(""),
                        remedy);
        return Optional.empty();
    }

    private Optional<Where> line(Value form) {
        Optional<Geometry> line = drawing.geometry(form, "a line", "LINESTRING", "MULTILINESTRING");
        return line.map(this::onLine);
    }

    private Optional<Where> cut(Value form) {
        Optional<Geometry> line = drawing.geometry(form, "a line", "LINESTRING", "MULTILINESTRING");
        for (int i = 0; i < line.map(Geometry::getNumGeometries).orElse(0); i++) {
            cuts.add((LineString) line.get().getGeometryN(i));
        }
        return line.map(Where.OnCut::new);
    }

    private Where onLine(Geometry line) {
        splitPoints.addAll(Arrays.asList(line.getCoordinates()));
        return new Where.OnLine(line);
    }

    private Optional<Where> layer(Value form) {
        Optional<String> name = form.text();
        name.ifPresent(n -> recordUse.use(Kind.LINE, n));
        if (name.isEmpty()) {
            recordUse.setUncertain();
            return Optional.empty();
        }
        if (!drawing.stated()) {
            form.findings()
                    .error(
                            "layer-missing",
                            form.place(),
                            form.name() + " is '" + name.get() + "', but the case names no outline file",
                            "name one under [outline], or write { line = \"LINESTRING (…)\" }");
            return Optional.empty();
        }
        // A file that cannot be read was reported where it is named.
        return drawing.outline().flatMap(o -> layer(form, name.get(), o));
    }

    private Optional<Where> layer(Value form, String name, Outline outline) {
        List<LineString> lines = new ArrayList<>();
        for (OutlineElement element : outline.find(name, Kind.LINE)) {
            for (int i = 0; i < element.shape().getNumGeometries(); i++) {
                lines.add((LineString) element.shape().getGeometryN(i));
            }
        }
        if (!lines.isEmpty()) {
            return Optional.of(onLine(new GeometryFactory().createMultiLineString(lines.toArray(new LineString[0]))));
        }
        boolean loops = !outline.find(name, Kind.REGION).isEmpty();
        List<String> known = drawing.names(Kind.LINE);
        form.findings()
                .error(
                        "layer-missing",
                        form.place(),
                        form.name() + " is '" + name + "', but "
                                + (loops
                                        ? "in " + drawing.fileName() + " that " + drawing.named()
                                                + " holds closed loops only"
                                        : drawing.fileName() + " has no " + drawing.named()
                                                + " of that name with a line"),
                        loops
                                ? "write { of = \"" + name + "\" } for the border of a region, or draw an open line"
                                : known.isEmpty()
                                        ? "draw a line along the edge, on a layer of its own"
                                        : NearestWord.remedy(name, known, "line"));
        return Optional.empty();
    }

    private Optional<Where> inside(Value form) {
        return drawing.geometry(form, "an area", "POLYGON", "MULTIPOLYGON")
                .filter(g -> isSound(g, form))
                .map(Where.Inside::new);
    }

    private boolean isSound(Geometry polygon, Value form) {
        Findings found = new Findings();
        boolean sound = OutlineCheck.check(CHECKED, polygon, form.place(), drawing.unit(), found);
        for (Finding f : found.all()) {
            // The check speaks of a region; this polygon is none.
            String what = f.what().replace("region '" + CHECKED + "'", form.name());
            form.findings().add(new Finding(f.severity(), f.code(), f.place(), what, f.remedy()));
        }
        return sound;
    }

    private Optional<Where> between(Value form) {
        List<Value> elements = form.elements("{ between = [\"A\", \"B\"] }");
        if (!form.isArray()) {
            return Optional.empty();
        }
        if (elements.size() != 2) {
            form.findings()
                    .error(
                            "where-form",
                            form.place(),
                            form.name() + " has " + elements.size() + " elements, where two regions are wanted",
                            "write { between = [\"A\", \"B\"] }");
            return Optional.empty();
        }
        Optional<Integer> first = region(elements.get(0));
        Optional<Integer> second = region(elements.get(1));
        if (first.isEmpty() || second.isEmpty()) {
            return Optional.empty();
        }
        if (first.equals(second)) {
            form.findings()
                    .error(
                            "where-form",
                            form.place(),
                            form.name() + " names region '" + elements.get(0).raw() + "' twice",
                            "name two different regions, or write { of = \"…\" } for the border of one");
            return Optional.empty();
        }
        return Optional.of(new Where.Between(first.get(), second.get()));
    }

    private Optional<Integer> region(Value value) {
        return value.text()
                .filter(name -> names.check(name, value.place(), value.name(), "", Names.Kind.REGION))
                .map(regions::indexOf)
                .filter(i -> i >= 0);
    }
}
