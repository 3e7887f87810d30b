package tepor.solver.casefile;

import java.util.BitSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.section.Section;
import tepor.solver.model.Air;
import tepor.solver.model.Edge;
import tepor.solver.model.Region;

/**
 * What asks and mesh can refer to, as far as it is sound.
 *
 * @param names all names, of sound and faulty things alike
 * @param regions by name; faulty ones are missing
 * @param holes names of the regions of nothing
 * @param airs by name; faulty ones are missing
 * @param usedAirs names of the airs in which an edge is
 * @param edges by name; faulty ones are missing
 * @param section empty where regions are faulty
 * @param passable segments through which heat may pass
 */
record CaseParts(
        Names names,
        Map<String, Region> regions,
        Set<String> holes,
        Map<String, Air> airs,
        Set<String> usedAirs,
        Map<String, Edge> edges,
        Optional<Section> section,
        BitSet passable) {
    private static final double COVERED = 1e-12; // of the square of the extent; less is round-off

    /** Whether later regions cover all of a region; false where that is not known. */
    boolean isCovered(Region region) {
        return section.isPresent()
                && section.get().area(region.index())
                        <= COVERED * section.get().extent() * section.get().extent();
    }
}
