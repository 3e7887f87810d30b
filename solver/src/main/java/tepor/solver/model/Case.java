package tepor.solver.model;

import java.util.List;
import java.util.Map;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.Section;

/**
 * A case: everything the user stated, checked, with edges found on the section.
 *
 * @param name the case file's stem, or its folder's name when the stem is {@code case}
 * @param title the title
 * @param depth metres; null where not stated
 * @param reportFields the free text of {@code [report]} by key, in the order written
 * @param section the section
 * @param unit the drawing's unit
 * @param regions in the order of the section's region numbers
 * @param materials in the order written
 * @param airs in the order written
 * @param edges in the order written
 * @param asks in the order written
 * @param mesh what is asked of the mesh
 * @param accuracy how accuracy is sought
 * @param inputs every quantity with a path
 * @param warnings what was found while reading
 * @param files every file that was read, the case file first
 */
public record Case(
        String name,
        String title,
        Input depth,
        Map<String, String> reportFields,
        Section section,
        DrawingUnit unit,
        List<Region> regions,
        List<Material> materials,
        List<Air> airs,
        List<Edge> edges,
        List<Ask> asks,
        MeshRequest mesh,
        Accuracy accuracy,
        Inputs inputs,
        List<Finding> warnings,
        List<SourceFile> files) {
    public Case {
        regions = List.copyOf(regions);
        materials = List.copyOf(materials);
        airs = List.copyOf(airs);
        edges = List.copyOf(edges);
        asks = List.copyOf(asks);
        warnings = List.copyOf(warnings);
        files = List.copyOf(files);
    }
}
