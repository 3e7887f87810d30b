package tepor.mesher.soundness;

import java.util.Collection;
import org.locationtech.jts.geom.Envelope;
import tepor.mesher.section.RegionShape;
import tepor.mesher.section.SectionBuilder;

/**
 * What counts as one point, and what as too close, in a drawing.
 *
 * @param extent diagonal of all outlines, metres
 * @param snap points closer than this are one point, metres
 */
public record Closeness(double extent, double snap) {
    /** Gaps narrower than this share of the extent are reported. */
    public static final double GAP_SHARE = 1e-4;
    /** Points closer than this many snaps, but not within snap, are reported wherever they are. */
    public static final double NEAR_POINT_SNAPS = 10;

    /**
     * The closeness that the section of these regions will have.
     *
     * @param shapes all regions
     * @param stated the snap stated, metres; NaN where none is
     */
    public static Closeness of(Collection<RegionShape> shapes, double stated) {
        Envelope all = new Envelope();
        shapes.forEach(s -> all.expandToInclude(s.polygons().getEnvelopeInternal()));
        return new Closeness(all.getDiameter(), SectionBuilder.snap(shapes, stated));
    }

    /** Width below which a gap is reported, metres; never below a few snaps. */
    public double gap() {
        return Math.max(GAP_SHARE * extent, nearPoint());
    }

    /** Distance below which two points are too close, metres. */
    public double nearPoint() {
        return NEAR_POINT_SNAPS * snap;
    }
}
