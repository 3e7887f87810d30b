/**
 * What is drawn, as a painter over Graphics2D, the same for file, report and window.
 *
 * <p>May not know where a picture goes.
 */
package tepor.viewer.picture;
