/**
 * Drawings as they are: named regions, lines and points, read from text, each with its place in the file.
 *
 * <p>Also the words in which everything wrong is reported ({@link tepor.mesher.outline.Finding}). May not know how regions
 * lie over each other, nor anything of meshes or heat.
 */
package tepor.mesher.outline;
