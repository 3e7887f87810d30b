package tepor.viewer.export;

import java.io.IOException;
import java.io.OutputStream;

/** Writes what a file is to hold. */
@FunctionalInterface
public interface FileContent {
    /** Writes everything; the stream is closed by the one who opened it. */
    void writeTo(OutputStream out) throws IOException;
}
