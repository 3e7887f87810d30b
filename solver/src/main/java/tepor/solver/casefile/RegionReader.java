package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.RegionShape;
import tepor.solver.casefile.DrawingReader.Drawing;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.HeatSource;
import tepor.solver.model.Input;
import tepor.solver.model.Material;
import tepor.solver.model.Region;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;

/** Reads {@code [[region]]}: what each region is made of, what it produces, and its outline. */
final class RegionReader {
    private static final Keys REGION = Keys.of("name", "outline", "material", "heat");

    private final Drawing drawing;
    private final QuantityKeys quantities;
    private final Map<String, Optional<Material>> materials;
    private final boolean depthStated;
    private final Set<String> usedMaterials = new HashSet<>();
    private final RecordUse recordUse;
    private boolean complete = true;

    /**
     * @param drawing the drawing
     * @param recordUse takes which records of the drawing are used
     * @param quantities reads the heats
     * @param materials all materials by name; empty where one has a fault
     * @param depthStated whether the case states a depth
     */
    RegionReader(
            Drawing drawing,
            RecordUse recordUse,
            QuantityKeys quantities,
            Map<String, Optional<Material>> materials,
            boolean depthStated) {
        this.drawing = drawing;
        this.recordUse = recordUse;
        this.quantities = quantities;
        this.materials = materials;
        this.depthStated = depthStated;
    }

    /**
     * A region as it is written.
     *
     * @param name its name
     * @param hole whether it is of nothing
     * @param region empty where something in it is wrong
     * @param shape empty where its outline is wrong
     * @param table where it is written
     */
    record WrittenRegion(
            String name, boolean hole, Optional<Region> region, Optional<RegionShape> shape, KeyTable table) {}

    /** All regions with a name, in the order written, which is the order they are laid. */
    List<WrittenRegion> read(KeyTable root) {
        List<WrittenRegion> regions = new ArrayList<>();
        List<KeyTable> tables = root.arrayTables("region");
        if (tables.isEmpty() && !root.has("region")) {
            root.missing("region", "[[region]] with name, material and outline, for every region of the section");
        }
        for (KeyTable table : tables) {
            table.allow(REGION);
            Optional<String> name = table.requiredText("name", "name = \"…\"");
            complete &= name.isPresent() && table.has("material");
            region(table, name, regions.size()).ifPresent(regions::add);
        }
        warnOfUnused(root);
        return regions;
    }

    private Optional<WrittenRegion> region(KeyTable table, Optional<String> name, int index) {
        Optional<String> materialName = table.requiredText("material", "material = \"…\", or \"nothing\" for a hole");
        boolean hole = materialName.filter(MaterialReader.NOTHING::equals).isPresent();
        Optional<Material> material = materialName.filter(m -> !hole).flatMap(m -> material(table, m));
        Optional<HeatSource> heat = heat(table, name.orElse(""), hole);
        OutlineFinder finder = new OutlineFinder(drawing, recordUse);
        Optional<RegionShape> shape =
                name.isPresent() || table.has("outline") ? finder.find(name.orElse(""), hole, table) : Optional.empty();
        if (name.isEmpty()) {
            return Optional.empty();
        }
        boolean sound = hole || material.isPresent() && heat.isPresent() == table.has("heat");
        Optional<Region> region = sound
                ? Optional.of(new Region(name.get(), index, material.orElse(null), heat.orElse(null), table.place()))
                : Optional.empty();
        return Optional.of(new WrittenRegion(name.get(), hole, region, shape, table));
    }

    private Optional<Material> material(KeyTable table, String name) {
        usedMaterials.add(name);
        if (!materials.containsKey(name)) {
            List<String> known = new ArrayList<>(materials.keySet());
            known.add(MaterialReader.NOTHING);
            table.findings()
                    .error(
                            "unknown-material",
                            table.place("material"),
                            table.label() + " is of '" + name + "', but no material has that name",
                            NearestWord.to(name, known)
                                    .map(near -> "did you mean '" + near + "'")
                                    .orElse("state its conductivity under [material."
                                            + (KeyTable.isBare(name) ? name : "\"" + name + "\"") + "]"));
            return Optional.empty();
        }
        return materials.get(name);
    }

    private Optional<HeatSource> heat(KeyTable table, String name, boolean hole) {
        Optional<Value> value = table.value("heat");
        if (value.isEmpty()) {
            return Optional.empty();
        }
        if (hole) {
            table.findings()
                    .error(
                            "heat-in-hole",
                            table.place("heat"),
                            table.label() + " is of nothing, but states a heat: "
                                    + value.get().found(),
                            "leave the heat out, or give the region a material");
            return Optional.empty();
        }
        if (value.get().isTable()) {
            table.later(
                    value.get().place(),
                    value.get().name() + " as a table (is, at, rise)",
                    "state one value, that at the temperature expected, such as heat = \"42 W/m\"");
            return Optional.empty();
        }
        Optional<Quantity> quantity = quantities.read(
                value.get(), Range.ANY, Dimension.HEAT_PER_LENGTH, Dimension.HEAT_PER_VOLUME, Dimension.HEAT);
        if (quantity.isPresent() && quantity.get().dimension() == Dimension.HEAT && !depthStated) {
            table.findings()
                    .error(
                            "depth-missing",
                            value.get().place(),
                            value.get().name() + " is \"" + value.get().raw()
                                    + "\" for the whole depth, but the case states no depth",
                            "state depth = \"1 m\" (before the first table), or the heat in W/m or W/m3");
            return Optional.empty();
        }
        String path = QuantityKeys.path("region", name, "heat");
        if (quantity.isEmpty() || name.isEmpty()) {
            quantities.addFaulty(path);
            return Optional.empty();
        }
        Optional<Input> amount =
                quantities.add(path, quantity.get(), Range.ANY, value.get().place());
        return amount.map(a -> new HeatSource(a, basis(a.quantity().dimension())));
    }

    private static HeatSource.Basis basis(Dimension dimension) {
        return switch (dimension) {
            case HEAT_PER_VOLUME -> HeatSource.Basis.PER_VOLUME;
            case HEAT -> HeatSource.Basis.TOTAL;
            default -> HeatSource.Basis.PER_LENGTH;
        };
    }

    private void warnOfUnused(KeyTable root) {
        // A region without its name or material may have meant any of them.
        if (!complete) {
            recordUse.setUncertain();
            return;
        }
        root.reportingTo(new Findings()).namedTables("material").forEach((name, table) -> {
            if (!usedMaterials.contains(name) && !name.equals(MaterialReader.NOTHING)) {
                root.findings()
                        .warning(
                                "unused-material",
                                table.place(),
                                "no region is of material '" + name + "'",
                                "leave it out, or check the materials of the regions");
            }
        });
    }
}
