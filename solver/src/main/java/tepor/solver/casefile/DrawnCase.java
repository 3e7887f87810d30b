package tepor.solver.casefile;

import java.nio.file.Path;
import java.util.List;
import tepor.mesher.mending.MendedOutline;
import tepor.mesher.mending.OutlineMender;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.section.RegionShape;
import tepor.mesher.soundness.Closeness;

/**
 * The outlines of a case as they are drawn, faulty or not, and nothing else of it.
 *
 * @param name the case's name
 * @param unit of the drawing
 * @param snap metres; NaN where none is stated
 * @param regions whose outline could be read, in the order they are laid, metres
 * @param others lines, points and regions of the drawing's file that are no region of the case
 * @param inline whether any region has its outline in the case file
 * @param files every file that was read, the case file first
 * @param findings what was found in reading
 */
public record DrawnCase(
        String name,
        DrawingUnit unit,
        double snap,
        List<RegionShape> regions,
        List<OutlineElement> others,
        boolean inline,
        List<Path> files,
        List<Finding> findings) {
    public DrawnCase {
        regions = List.copyOf(regions);
        others = List.copyOf(others);
        files = List.copyOf(files);
        findings = List.copyOf(findings);
    }

    /** The outlines mended. */
    public MendedOutline mended() {
        return OutlineMender.mend(regions, Closeness.of(regions, snap), unit);
    }
}
