/**
 * The mending of outlines, and their writing as well-known text.
 *
 * <p>Mends what {@code OutlineCheck} and {@code SectionCheck} find, and lists each change. May not know of triangles, nor
 * anything of heat.
 */
package tepor.mesher.mending;
