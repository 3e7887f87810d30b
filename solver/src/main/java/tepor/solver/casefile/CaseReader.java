package tepor.solver.casefile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.RegionShape;
import tepor.mesher.section.Section;
import tepor.mesher.section.SectionBuilder;
import tepor.mesher.soundness.Closeness;
import tepor.mesher.soundness.SectionCheck;
import tepor.solver.casefile.AirReader.WrittenAir;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.EdgeReader.WrittenEdge;
import tepor.solver.casefile.RegionReader.WrittenRegion;
import tepor.solver.casefile.TargetReader.Parts;
import tepor.solver.model.Accuracy;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.Input;
import tepor.solver.model.Inputs;
import tepor.solver.model.Material;
import tepor.solver.model.MeshRequest;
import tepor.solver.model.Region;

/** Reads a case file and the outlines it names. */
public final class CaseReader {
    private final CaseFiles files;
    private final Findings findings;
    private final Inputs inputs = new Inputs();
    private final QuantityKeys quantities;

    private CaseReader(Path file) {
        findings = new Findings();
        files = new CaseFiles(file, findings);
        quantities = new QuantityKeys(inputs, findings);
    }

    /**
     * Reads a case.
     *
     * @param file the TOML file
     * @throws tepor.mesher.outline.FaultyInputException if anything in the case is wrong; carries all that is
     */
    public static Case read(Path file) {
        return new CaseReader(file).read();
    }

    private Case read() {
        Optional<KeyTable> parsed = files.readCase();
        findings.throwIfFaulty();
        KeyTable root = parsed.orElseThrow();
        boolean readable = HeadReader.readFormat(root);
        if (!readable) {
            findings.throwIfFaulty();
        }
        root.allow(HeadReader.CASE);
        HeadReader.checkSymmetry(root);
        String name = files.stem();
        String title = HeadReader.readTitle(root, name);
        Input depth = HeadReader.readDepth(root, quantities);
        Map<String, String> report = HeadReader.readReport(root);
        Accuracy accuracy = HeadReader.readAccuracy(root);

        Names names = Names.of(root);
        Drawing drawing = DrawingReader.read(root, files, quantities);
        RecordUse recordUse = new RecordUse();
        Map<String, Optional<Material>> materials = new MaterialReader(quantities).read(root);
        List<WrittenRegion> regions =
                new RegionReader(drawing, recordUse, quantities, materials, root.has("depth")).read(root);
        Map<String, WrittenAir> airs = new AirReader(quantities).read(root);
        List<String> regionNames = regions.stream().map(WrittenRegion::name).toList();
        WhereReader whereReader = new WhereReader(names, drawing, recordUse, regionNames);
        ConditionReader conditionReader = new ConditionReader(names, airs, quantities, findings);
        List<WrittenEdge> edges = new EdgeReader(whereReader, conditionReader).read(root);
        conditionReader.warnOfUnusedAirs();
        recordUse.warnOfUnused(drawing, findings);
        checkTied(root);

        Map<String, RegionShape> shapes = new LinkedHashMap<>();
        regions.forEach(r -> r.shape().ifPresent(s -> shapes.put(r.name(), s)));
        Optional<Section> section = section(root, regions, shapes, whereReader, drawing);
        Parts parts = parts(names, regions, airs, conditionReader.usedAirs(), edges, section, drawing);
        List<Ask> asks = new AskReader(parts, drawing, quantities, findings).read(root);
        MeshRequest mesh = new MeshReader(parts, shapes, drawing, quantities, findings).read(root);
        warnOfSpreads();
        findings.throwIfFaulty();
        return new Case(
                name,
                title,
                depth,
                report,
                section.orElseThrow(),
                drawing.unit(),
                regions.stream().map(r -> r.region().orElseThrow()).toList(),
                materials.values().stream().map(Optional::orElseThrow).toList(),
                airs.values().stream().map(a -> a.air().orElseThrow()).toList(),
                new ArrayList<>(parts.edges().values()),
                asks,
                mesh,
                accuracy,
                inputs,
                findings.warnings(),
                files.files());
    }

    /** A section whose temperature nothing determines has no answer; what floats in part is found when it is solved. */
    private void checkTied(KeyTable root) {
        List<KeyTable> edges = root.reportingTo(new Findings()).arrayTables("edge");
        boolean unreadable = root.has("edge") && edges.isEmpty();
        boolean tied = edges.stream()
                .anyMatch(e -> Set.of("temperature", "film", "resistance", "air").stream()
                        .anyMatch(e::has));
        if (!tied && !unreadable) {
            findings.error(
                    "nothing-tied",
                    edges.isEmpty() ? root.place() : edges.get(0).place(),
                    "no edge states a temperature, film or resistance, so that nothing ties the section to a"
                            + " temperature",
                    "write temperature = \"…\", or air = \"…\" with film = \"…\" or resistance = \"…\", on at least one"
                            + " [[edge]]");
        }
    }

    /** The section; empty where any region is faulty, since it would then be another section. */
    private Optional<Section> section(
            KeyTable root,
            List<WrittenRegion> regions,
            Map<String, RegionShape> shapes,
            WhereReader whereReader,
            Drawing drawing) {
        int tables = root.reportingTo(new Findings()).arrayTables("region").size();
        if (tables == 0 || shapes.size() < tables || regions.stream().allMatch(WrittenRegion::hole)) {
            return Optional.empty();
        }
        List<RegionShape> inOrder = List.copyOf(shapes.values());
        SectionCheck.check(inOrder, Closeness.of(inOrder, drawing.snap()), drawing.unit(), findings);
        return SectionBuilder.build(
                inOrder, whereReader.splitPoints(), whereReader.cuts(), drawing.snap(), drawing.unit(), findings);
    }

    private Parts parts(
            Names names,
            List<WrittenRegion> regions,
            Map<String, WrittenAir> airs,
            Set<String> usedAirs,
            List<WrittenEdge> writtenEdges,
            Optional<Section> section,
            Drawing drawing) {
        Map<String, Region> soundRegions = new HashMap<>();
        Set<String> holes = new HashSet<>();
        for (WrittenRegion region : regions) {
            region.region().ifPresent(r -> soundRegions.put(region.name(), r));
            if (region.hole()) {
                holes.add(region.name());
            }
        }
        Map<String, Air> soundAirs = new HashMap<>();
        airs.forEach((name, written) -> written.air().ifPresent(a -> soundAirs.put(name, a)));
        Map<String, Edge> edges = Map.of();
        BitSet passable = new BitSet();
        if (section.isPresent()) {
            EdgePlacer placer = new EdgePlacer(section.get(), drawing.unit(), findings);
            edges = placer.place(writtenEdges);
            passable = placer.passable(edges);
        }
        return new Parts(names, soundRegions, holes, soundAirs, usedAirs, edges, section, passable);
    }

    private void warnOfSpreads() {
        List<Input> spread =
                inputs.all().stream().filter(i -> i.quantity().hasSpread()).toList();
        if (!spread.isEmpty()) {
            Input first = spread.get(0);
            findings.warning(
                    "spreads-not-counted",
                    first.place(),
                    (spread.size() == 1
                                    ? "the spread of " + first.path() + " is"
                                    : "the spreads of " + spread.size() + " inputs, first " + first.path() + ", are")
                            + " read and kept, but not counted in the interval yet",
                    "");
        }
    }
}
