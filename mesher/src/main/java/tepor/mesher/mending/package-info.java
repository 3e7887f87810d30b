/**
 * What is wrong between outlines that are sound one by one (gaps, slivers, points that nearly meet), and the mending of
 * outlines.
 *
 * <p>Works on what was drawn, before it is laid together to a section. May not know of triangles, nor anything of heat.
 */
package tepor.mesher.mending;
