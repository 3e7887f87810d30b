package tepor.mesher.outline;

import java.util.Optional;
import org.locationtech.jts.geom.Geometry;

/** Reads outlines written in OGC well-known text. */
public final class WktReader {
    private WktReader() {}

    /**
     * Reads a whole file: records of an optional {@code name:} and one geometry, {@code #} starts a comment.
     *
     * @param fileName the file as the user named it, for messages
     * @param text what is in it
     * @param unit the unit of its coordinates
     * @param findings takes what is wrong
     * @return what could be read; elements in metres
     */
    public static Outline read(String fileName, String text, DrawingUnit unit, Findings findings) {
        throw new IllegalStateException("not joined yet");
    }

    /**
     * Reads one geometry written inside a case file.
     *
     * @param text the geometry
     * @param place where it stands, for messages
     * @param unit the unit of its coordinates
     * @param findings takes what is wrong
     * @return the geometry in metres; empty where something was wrong
     */
    public static Optional<Geometry> readGeometry(String text, Place place, DrawingUnit unit, Findings findings) {
        throw new IllegalStateException("not joined yet");
    }
}
