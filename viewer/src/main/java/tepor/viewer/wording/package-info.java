/**
 * Answers in the units in which they are read, and in words: what JSON, report, terminal and pictures say alike.
 *
 * <p>May not know files, nor how a text is laid out.
 */
package tepor.viewer.wording;
