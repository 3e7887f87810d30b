/**
 * Curves that are neither straight nor circular, where they are laid, and the arcs of circles that follow them.
 *
 * <p>May not know of files, nor of what is drawn with the curves.
 */
package tepor.mesher.curve;
