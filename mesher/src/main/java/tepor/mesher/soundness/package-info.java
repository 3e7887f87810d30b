/**
 * What is wrong between outlines that are sound one by one: gaps, slivers, points that nearly meet, needles, regions drawn
 * twice; and what may well be meant so: thin layers and partial overlaps.
 *
 * <p>Works on what was drawn, before it is laid together to a section. May not know of triangles, nor anything of heat.
 */
package tepor.mesher.soundness;
