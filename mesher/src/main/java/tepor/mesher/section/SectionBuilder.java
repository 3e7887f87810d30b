package tepor.mesher.section;

import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;

/** Lays regions over each other and makes the section. */
public final class SectionBuilder {
    private SectionBuilder() {}

    /**
     * Builds the section.
     *
     * @param shapes regions in the order they are laid: later ones lie over earlier ones, and cut them
     * @param splitPoints points (metres) at which a segment they lie on, within snap, is split
     * @param snap distance below which two points are one, metres; NaN for 1e-7 of the extent
     * @param unit the drawing's unit, for coordinates in messages
     * @param findings takes what is wrong, and warnings
     * @return the section; empty where something was wrong
     */
    public static Optional<Section> build(
            List<RegionShape> shapes, List<Coordinate> splitPoints, double snap, DrawingUnit unit, Findings findings) {
        throw new IllegalStateException("not joined yet");
    }
}
