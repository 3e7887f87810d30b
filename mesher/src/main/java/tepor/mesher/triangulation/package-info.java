/**
 * Exact geometric predicates and constrained Delaunay triangulation in flat arrays.
 *
 * <p>May not know why a point is inserted, nor anything of regions' materials or heat.
 */
package tepor.mesher.triangulation;
