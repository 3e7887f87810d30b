package tepor.solver.model;

import tepor.mesher.outline.Place;

/**
 * A named surrounding.
 *
 * @param name its name in the case
 * @param temperature kelvin
 * @param film W/(m²·K), of every edge in this air that states none; null where not stated
 * @param place where the user wrote it
 */
public record Air(String name, Input temperature, Input film, Place place) {}
