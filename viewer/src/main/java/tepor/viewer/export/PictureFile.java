package tepor.viewer.export;

/**
 * A picture, drawn and ready to be written or set into a report.
 *
 * @param name of its file
 * @param mediaType such as {@code image/png}
 * @param description what it shows, in one line, for those who cannot see it
 * @param bytes the file's content
 */
public record PictureFile(String name, String mediaType, String description, byte[] bytes) {}
