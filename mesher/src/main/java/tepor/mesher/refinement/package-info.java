/**
 * Size fields and quality refinement of a triangulated section, with due regard to small angles.
 *
 * <p>May not know the finished mesh, nor anything of heat.
 */
package tepor.mesher.refinement;
