package tepor.solver.casefile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.outline.Place;
import tepor.mesher.section.RegionShape;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.model.Inputs;

/** Reads the outlines of a case, whatever else in it is wrong. */
public final class DrawnCaseReader {
    private DrawnCaseReader() {}

    /**
     * Reads the outlines.
     *
     * @param file the TOML file
     * @throws tepor.mesher.outline.FaultyInputException if the file cannot be read, is not TOML, or does not say its unit
     */
    public static DrawnCase read(Path file) {
        Findings findings = new Findings();
        CaseFiles files = new CaseFiles(file, findings);
        Optional<KeyTable> parsed = files.readCase();
        findings.throwIfFaulty();
        KeyTable root = parsed.orElseThrow();
        Drawing drawing = DrawingReader.read(root, files, new QuantityKeys(new Inputs(), findings));
        findings.throwIfFaulty();
        List<RegionShape> regions = new ArrayList<>();
        Set<String> used = new HashSet<>();
        boolean inline = false;
        for (KeyTable table : root.reportingTo(new Findings()).arrayTables("region")) {
            KeyTable reporting = table.reportingTo(findings);
            String name = table.text("name").orElse("");
            boolean hole = table.text("material")
                    .filter(MaterialReader.NOTHING::equals)
                    .isPresent();
            Optional<Value> value = reporting.value("outline");
            inline |= value.isPresent();
            if (value.isPresent()) {
                Place place = value.get().place();
                drawing.geometry(value.get(), "an area", "POLYGON", "MULTIPOLYGON")
                        .ifPresent(g -> regions.add(new RegionShape(name, g, hole, place)));
            } else {
                List<OutlineElement> records = drawing.outline()
                        .map(o -> o.find(name, OutlineElement.Kind.REGION))
                        .orElse(List.of());
                if (!records.isEmpty()) {
                    used.add(name);
                    Geometry shape = records.size() == 1 ? records.get(0).shape() : OutlineFinder.together(records);
                    regions.add(
                            new RegionShape(name, shape, hole, records.get(0).place()));
                }
            }
        }
        List<OutlineElement> others = drawing.outline().map(o -> o.elements()).orElse(List.of()).stream()
                .filter(e -> e.kind() != OutlineElement.Kind.REGION || !used.contains(e.name()))
                .toList();
        List<Path> read = new ArrayList<>(List.of(file));
        if (!drawing.fileName().isEmpty()) {
            read.add(file.resolveSibling(drawing.fileName()));
        }
        return new DrawnCase(
                files.stem(), drawing.unit(), drawing.snap(), regions, others, inline, read, findings.all());
    }
}
