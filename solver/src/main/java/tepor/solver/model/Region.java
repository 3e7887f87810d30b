package tepor.solver.model;

import tepor.mesher.outline.Place;

/**
 * A region.
 *
 * @param name its name in the case
 * @param index its number in the section
 * @param material null where it is of nothing
 * @param heat null where none is produced
 * @param place where the user wrote it
 */
public record Region(String name, int index, Material material, HeatSource heat, Place place) {
    public boolean isHole() {
        return material == null;
    }
}
