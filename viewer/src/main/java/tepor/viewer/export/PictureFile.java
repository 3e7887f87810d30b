package tepor.viewer.export;

/**
 * A picture, drawn and ready to be set into a report.
 *
 * @param mediaType such as {@code image/png}
 * @param description what it shows, in one line, for those who cannot see it
 * @param bytes the file's content
 */
public record PictureFile(String mediaType, String description, byte[] bytes) {}
