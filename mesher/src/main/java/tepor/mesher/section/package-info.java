/**
 * The section: the planar graph that the outlines make once overlaps are resolved, and the ways to name its edges.
 *
 * <p>May not know of triangles, nor anything of heat.
 */
package tepor.mesher.section;
