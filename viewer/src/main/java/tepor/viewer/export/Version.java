package tepor.viewer.export;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The version of Tepor that runs. */
public final class Version {
    private static final String TEXT = read();

    private Version() {}

    /** Such as "0.1.0". */
    public static String text() {
        return TEXT;
    }

    private static String read() {
        try (InputStream in = Version.class.getResourceAsStream("version.txt")) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
