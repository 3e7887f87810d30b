package tepor.viewer.picture.drawing;

import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Finds places for tags beside the points they belong to: within a frame, on no other tag or point, with leader lines that
 * cross neither each other nor other tags.
 */
public final class TagPlacer {
    private static final int DIRECTIONS = 24;
    private static final double[] DISTANCES = {1.5, 2.1, 2.9, 3.9, 5.2, 7, 9.5, 13, 18, 25};

    /** Points nearer than so many heights of a tag make a crowd. */
    private static final double CROWD = 3;

    private final Rectangle2D frame;
    private final double size;
    private final List<Rectangle2D> taken = new ArrayList<>();
    private final List<Line2D> leaders = new ArrayList<>();
    private final List<double[]> points = new ArrayList<>();

    /**
     * @param frame in which tags must lie
     * @param size height of a tag
     */
    public TagPlacer(Rectangle2D frame, double size) {
        this.frame = frame;
        this.size = size;
    }

    /** Announces a point that tags and leaders keep clear of; announce all before the first is placed. */
    public void keepClear(double x, double y) {
        points.add(new double[] {x, y});
    }

    /**
     * Places a tag.
     *
     * @param x of its point
     * @param y of its point
     * @param width of the tag
     * @param away direction to try first, radians, clockwise on the page; NaN for any
     * @return the tag's centre
     */
    public double[] place(double x, double y, double width, double away) {
        double[] best = null;
        double least = Double.POSITIVE_INFINITY;
        double first = Double.isNaN(away) ? outward(x, y) : away;
        for (double distance : DISTANCES) {
            for (int i = 0; i < DIRECTIONS; i++) {
                double turn = 2 * Math.PI * ((i + 1) / 2) / DIRECTIONS * (i % 2 == 0 ? 1 : -1);
                double angle = first + turn;
                double cx = x + (distance * size + 0.5 * (width - size)) * Math.cos(angle);
                double cy = y + distance * size * Math.sin(angle);
                double cost = faults(x, y, cx, cy, width) * 1000
                        + distance
                        + Math.abs(turn) * (Double.isNaN(away) ? 0.1 : 0.6);
                if (cost < least) {
                    least = cost;
                    best = new double[] {cx, cy};
                }
            }
        }
        taken.add(box(best[0], best[1], width));
        leaders.add(new Line2D.Double(x, y, best[0], best[1]));
        return best;
    }

    /** Upwards to the right; in a crowd away from its middle, so that leaders fan out. */
    private double outward(double x, double y) {
        double sumX = 0;
        double sumY = 0;
        int crowd = 0;
        for (double[] p : points) {
            if (Math.hypot(p[0] - x, p[1] - y) < CROWD * size) {
                sumX += p[0] - x;
                sumY += p[1] - y;
                crowd++;
            }
        }
        return crowd < 4 || Math.hypot(sumX, sumY) < 1e-9 * size ? -Math.PI / 4 : Math.atan2(-sumY, -sumX);
    }

    private Rectangle2D box(double cx, double cy, double width) {
        return new Rectangle2D.Double(cx - width / 2, cy - size / 2, width, size);
    }

    private int faults(double x, double y, double cx, double cy, double width) {
        Rectangle2D box = box(cx, cy, width);
        int faults = frame.contains(box) ? 0 : 3;
        Rectangle2D roomy = new Rectangle2D.Double(
                box.getX() - 0.2 * size, box.getY() - 0.2 * size, width + 0.4 * size, 1.4 * size);
        Line2D leader = new Line2D.Double(x, y, cx, cy);
        for (Rectangle2D other : taken) {
            faults += roomy.intersects(other) ? 2 : 0;
            faults += leader.intersects(other) ? 1 : 0;
        }
        for (Line2D other : leaders) {
            faults += leader.intersectsLine(other) ? 1 : 0;
            faults += other.intersects(roomy) ? 1 : 0;
        }
        for (double[] p : points) {
            if (p[0] == x && p[1] == y) {
                continue;
            }
            faults += roomy.contains(p[0], p[1]) ? 2 : 0;
            faults += leader.ptSegDist(p[0], p[1]) < 0.45 * size ? 1 : 0;
        }
        return faults;
    }
}
