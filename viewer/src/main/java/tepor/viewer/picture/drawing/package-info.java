/**
 * What every picture is made of: the font, inks, tags with leader lines, lists, and the room that is left for text.
 *
 * <p>May not know of temperatures, cases or sections. Lengths are in pixels, y downwards.
 */
package tepor.viewer.picture.drawing;
