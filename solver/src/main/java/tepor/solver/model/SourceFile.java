package tepor.solver.model;

/**
 * A file that was read.
 *
 * @param name as the user named it
 * @param sha256 its digest, 64 hexadecimal digits in lower case
 */
public record SourceFile(String name, String sha256) {}
