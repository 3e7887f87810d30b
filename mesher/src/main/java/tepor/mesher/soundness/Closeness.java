package tepor.mesher.soundness;

import java.util.Collection;
import org.locationtech.jts.geom.Envelope;
import tepor.mesher.section.RegionShape;

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

    private static final double DEFAULT_SNAP = 1e-7;
    private static final double LEAST_SNAP_IN_ULPS = 32;

    /**
     * The closeness that the section of these regions will have.
     *
     * @param shapes all regions
     * @param stated the snap stated, metres; NaN where none is
     */
    public static Closeness of(Collection<RegionShape> shapes, double stated) {
        Envelope all = new Envelope();
        shapes.forEach(s -> all.expandToInclude(s.polygons().getEnvelopeInternal()));
        double largest = Math.max(
                Math.max(Math.abs(all.getMinX()), Math.abs(all.getMaxX())),
                Math.max(Math.abs(all.getMinY()), Math.abs(all.getMaxY())));
        double wanted = Double.isNaN(stated) ? DEFAULT_SNAP * all.getDiameter() : stated;
        return new Closeness(all.getDiameter(), Math.max(wanted, LEAST_SNAP_IN_ULPS * Math.ulp(largest)));
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
