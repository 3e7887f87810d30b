package tepor.solver.casefile;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.dxf.DxfReader;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.outline.WktReader;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;
import tepor.solver.quantity.QuantityException;
import tepor.solver.quantity.QuantityReader;

/** Reads {@code [outline]}: the drawing's file, its unit and its snap. */
final class DrawingReader {
    private static final Keys OUTLINE = Keys.of("file", "unit", "snap");
    /** Stands in where the unit is missing or wrong, so that coordinates can be checked all the same. */
    private static final DrawingUnit UNKNOWN = new DrawingUnit("drawing units", 1);

    private DrawingReader() {}

    /**
     * What is known of the drawing.
     *
     * @param unit of every bare coordinate
     * @param snap metres; NaN where not stated
     * @param stated whether the case names a file, be it right or wrong
     * @param outline what is in the file; empty where there is none or something in it is wrong
     * @param fileName the file as the user named it; empty where there is none
     * @param dxf whether the file is DXF, where names are those of layers
     */
    record Drawing(
            DrawingUnit unit, double snap, boolean stated, Optional<Outline> outline, String fileName, boolean dxf) {
        /** What a name in the file is the name of. */
        String named() {
            return dxf ? "layer" : "record";
        }

        /** The names of the elements of one kind, in the order of the file. */
        List<String> names(OutlineElement.Kind kind) {
            return outline.map(Outline::elements).orElse(List.of()).stream()
                    .filter(e -> e.kind() == kind && !e.name().isEmpty())
                    .map(OutlineElement::name)
                    .distinct()
                    .toList();
        }

        /** A geometry written in the case file, of one of the types wanted; empty, with an error, where it is not. */
        Optional<Geometry> geometry(Value value, String wanted, String... types) {
            Optional<String> text = value.text();
            if (text.isEmpty()) {
                return Optional.empty();
            }
            Optional<Geometry> geometry = WktReader.readGeometry(text.get(), value.place(), unit, value.findings());
            if (geometry.isPresent()
                    && !List.of(types).contains(geometry.get().getGeometryType().toUpperCase(Locale.ROOT))) {
                value.findings()
                        .error(
                                "wrong-geometry",
                                value.place(),
                                value.name() + " is a "
                                        + geometry.get().getGeometryType().toUpperCase(Locale.ROOT) + ", where "
                                        + wanted + " is wanted",
                                "write a " + String.join(" or a ", types));
                return Optional.empty();
            }
            return geometry;
        }
    }

    static Drawing read(KeyTable root, CaseFiles files, QuantityKeys quantities) {
        Findings findings = root.findings();
        Optional<KeyTable> table = root.table("outline");
        table.ifPresent(t -> t.allow(OUTLINE));
        Optional<Value> file = table.flatMap(t -> t.value("file"));
        boolean dxf = file.filter(DrawingReader::isDxf).isPresent();
        Optional<Value> written = table.flatMap(t -> t.value("unit"));
        Optional<DrawingUnit> unit = written.flatMap(DrawingReader::unit);
        if (written.isEmpty() && !dxf) {
            findings.error(
                    "unit-missing",
                    table.map(KeyTable::place).orElse(root.place()),
                    "the case does not say in which unit its coordinates are",
                    "write unit = \"mm\" (or m, cm, in …) under [outline]; it is never guessed");
        }
        double snap = table.flatMap(t -> t.value("snap"))
                .flatMap(
                        v -> quantities.exact(v, "it only says which points are one", Range.POSITIVE, Dimension.LENGTH))
                .map(Quantity::value)
                .orElse(Double.NaN);
        // With a unit that is wrong, that of the drawing is not meant either.
        Optional<DrawingUnit> stated = written.isPresent() ? Optional.of(unit.orElse(UNKNOWN)) : unit;
        Optional<Outline> outline = file.flatMap(v -> outline(v, files, stated, snap));
        boolean known = unit.isPresent() || (written.isEmpty() && outline.isPresent());
        String fileName = file.filter(Value::isText).map(v -> (String) v.raw()).orElse("");
        return new Drawing(
                outline.filter(o -> dxf).map(Outline::unit).or(() -> unit).orElse(UNKNOWN),
                // A snap in metres says nothing about coordinates whose unit is not known.
                known ? snap : Double.NaN,
                file.isPresent(),
                outline,
                fileName,
                dxf);
    }

    private static boolean isDxf(Value file) {
        return file.isText() && ((String) file.raw()).toLowerCase(Locale.ROOT).endsWith(".dxf");
    }

    private static Optional<DrawingUnit> unit(Value value) {
        Optional<String> text = value.text().map(String::strip);
        if (text.isEmpty()) {
            return Optional.empty();
        }
        String remedy = "write the name of a unit of length alone, such as unit = \"mm\"";
        if (text.get().isEmpty() || !Character.isLetter(text.get().codePointAt(0))) {
            value.findings()
                    .error("unit-wrong", value.place(), value.name() + " is " + value.found() + ", not a unit", remedy);
            return Optional.empty();
        }
        try {
            Quantity one = QuantityReader.read("1 " + text.get(), Dimension.LENGTH);
            if (one.hasSpread()) {
                value.findings()
                        .error(
                                "unit-wrong",
                                value.place(),
                                value.name() + " is " + value.found() + ", not a unit",
                                remedy);
                return Optional.empty();
            }
            return Optional.of(new DrawingUnit(text.get(), one.value()));
        } catch (QuantityException e) {
            value.findings()
                    .error(
                            "unit-wrong",
                            value.place(),
                            value.name() + " is " + value.found() + ", not a unit of length",
                            remedy);
            return Optional.empty();
        }
    }

    private static Optional<Outline> outline(Value value, CaseFiles files, Optional<DrawingUnit> unit, double snap) {
        Optional<String> name = value.text();
        if (name.isEmpty()) {
            return Optional.empty();
        }
        Findings inFile = new Findings();
        Optional<Outline> outline = Optional.empty();
        if (isDxf(value)) {
            outline = files.readBytes(name.get(), value.place())
                    .map(bytes -> DxfReader.read(files.nameInMessages(name.get()), bytes, unit, snap, inFile));
        } else if (name.get().toLowerCase(Locale.ROOT).endsWith(".wkt")) {
            outline = files.read(name.get(), value.place())
                    .map(text -> WktReader.read(files.nameInMessages(name.get()), text, unit.orElse(UNKNOWN), inFile));
        } else {
            value.findings()
                    .error(
                            "file-extension",
                            value.place(),
                            "the outline file '" + name.get() + "' ends neither in .wkt nor in .dxf",
                            "name a drawing in DXF (NAME.dxf), or write the outlines as WKT into a file NAME.wkt");
        }
        inFile.all().forEach(value.findings()::add);
        // Where a record could not be read, regions would miss it for no other reason.
        return inFile.hasErrors() ? Optional.empty() : outline;
    }
}
