/**
 * Loops and lines out of pieces as they were drawn: pieces drawn twice are taken once, ends that meet are joined, loops lie
 * within each other.
 *
 * <p>May not know of files or layers.
 */
package tepor.mesher.chain;
