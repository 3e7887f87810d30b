/**
 * The isotherms of a temperature field as lines and areas, in metres and kelvin.
 *
 * <p>May not know of pixels, colours or text.
 */
package tepor.viewer.picture.contour;
