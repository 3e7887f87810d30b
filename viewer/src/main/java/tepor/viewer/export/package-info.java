/**
 * Answers and pictures as files: JSON, PNG, SVG; each whole or not at all.
 *
 * <p>May not know the command line.
 */
package tepor.viewer.export;
