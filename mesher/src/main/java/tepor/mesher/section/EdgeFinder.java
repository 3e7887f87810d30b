package tepor.mesher.section;

import java.util.BitSet;
import java.util.List;
import java.util.function.IntPredicate;
import java.util.function.IntUnaryOperator;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.prep.PreparedGeometry;
import org.locationtech.jts.geom.prep.PreparedGeometryFactory;
import tepor.mesher.outline.Circle;

/** Finds the pieces of a section's boundary and interfaces that a {@link Where} chooses. */
public final class EdgeFinder {
    /** Room for the round-off in distances that are exactly snap. */
    private static final double ROUND_OFF = 1 + 1e-6;

    private final Section section;
    private final double tolerance;
    private final BitSet boundary = new BitSet();

    /** @param section the section to search */
    public EdgeFinder(Section section) {
        this.section = section;
        tolerance = section.snap() * ROUND_OFF;
        for (int s = 0; s < section.segmentCount(); s++) {
            boundary.set(s, section.isBoundary(s));
        }
    }

    /**
     * Finds an edge.
     *
     * @param where where it is
     * @param conditioned segments on which other edges state a condition; {@link Where.Rest} leaves them out
     * @return its pieces; empty where nothing is found
     */
    public EdgePieces find(Where where, BitSet conditioned) {
        int[] sign = new int[section.segmentCount()]; // 0 where a segment is not of the edge
        mark(where, conditioned, sign);
        int count = 0;
        for (int s : sign) {
            count += s != 0 ? 1 : 0;
        }
        int[] segments = new int[count];
        int[] signs = new int[count];
        int at = 0;
        for (int s = 0; s < sign.length; s++) {
            if (sign[s] != 0) {
                segments[at] = s;
                signs[at++] = sign[s];
            }
        }
        return new EdgePieces(segments, signs);
    }

    /** Sets the signs of the segments chosen that have none yet. */
    private void mark(Where where, BitSet conditioned, int[] sign) {
        if (where instanceof Where.Union union) {
            union.parts().forEach(part -> mark(part, conditioned, sign));
        } else if (where instanceof Where.OnLine onLine) {
            markOnLine(onLine.line(), sign, s -> true);
        } else if (where instanceof Where.OnCut onCut) {
            markOnLine(onCut.line(), sign, s -> !boundary.get(s));
        } else if (where instanceof Where.OfRegion of) {
            int r = of.region();
            markAll(s -> section.left(s) == r ? 1 : section.right(s) == r ? -1 : 0, sign);
        } else if (where instanceof Where.Between between) {
            markAll(s -> betweenSign(s, between.first(), between.second()), sign);
        } else if (where instanceof Where.OnSide onSide) {
            markBoundary(sideTest(onSide.side()), sign);
        } else if (where instanceof Where.Outside) {
            markBoundary(section::isOuter, sign);
        } else if (where instanceof Where.Holes) {
            markBoundary(s -> !section.isOuter(s), sign);
        } else if (where instanceof Where.Rest) {
            markBoundary(s -> !conditioned.get(s), sign);
        } else if (where instanceof Where.Inside inside) {
            markBoundary(insideTest(inside.polygon()), sign);
        } else if (where instanceof Where.Nearest nearest) {
            markNearest(new Coordinate(nearest.x(), nearest.y()), sign);
        } else {
            throw new AssertionError("a kind of Where is not dealt with: " + where);
        }
    }

    private void markBoundary(IntPredicate test, int[] sign) {
        for (int s = boundary.nextSetBit(0); s >= 0; s = boundary.nextSetBit(s + 1)) {
            if (sign[s] == 0 && test.test(s)) {
                sign[s] = outOfMaterial(s);
            }
        }
    }

    /** Marks segments for which the test gives a sign; on the boundary, the sign is that of flow out of the material. */
    private void markAll(IntUnaryOperator test, int[] sign) {
        for (int s = 0; s < sign.length; s++) {
            if (sign[s] == 0) {
                int found = test.applyAsInt(s);
                sign[s] = found != 0 && boundary.get(s) ? outOfMaterial(s) : found;
            }
        }
    }

    private int outOfMaterial(int s) {
        return section.solidLeft(s) ? 1 : -1;
    }

    private int betweenSign(int s, int first, int second) {
        if (section.left(s) == first && section.right(s) == second) {
            return 1;
        }
        return section.left(s) == second && section.right(s) == first ? -1 : 0;
    }

    private IntPredicate sideTest(Where.Side side) {
        double[] box = section.bounds();
        return switch (side) {
            case LEFT -> s -> liesAtX(s, box[0]);
            case RIGHT -> s -> liesAtX(s, box[2]);
            case BOTTOM -> s -> liesAtY(s, box[1]);
            case TOP -> s -> liesAtY(s, box[3]);
        };
    }

    private boolean liesAtX(int s, double x) {
        return Math.abs(section.middle(s).x - x) <= tolerance
                && Math.abs(section.x(section.start(s)) - x) <= tolerance
                && Math.abs(section.x(section.end(s)) - x) <= tolerance;
    }

    private boolean liesAtY(int s, double y) {
        return Math.abs(section.middle(s).y - y) <= tolerance
                && Math.abs(section.y(section.start(s)) - y) <= tolerance
                && Math.abs(section.y(section.end(s)) - y) <= tolerance;
    }

    private void markOnLine(Geometry line, int[] sign, IntPredicate may) {
        LineCover cover = new LineCover(line, tolerance);
        markAll(
                s -> !may.test(s)
                        ? 0
                        : cover.direction(
                                section.x(section.start(s)),
                                section.y(section.start(s)),
                                section.x(section.end(s)),
                                section.y(section.end(s)),
                                section.circle(s)),
                sign);
    }

    private Coordinate start(int s) {
        return new Coordinate(section.x(section.start(s)), section.y(section.start(s)));
    }

    private Coordinate end(int s) {
        return new Coordinate(section.x(section.end(s)), section.y(section.end(s)));
    }

    private IntPredicate insideTest(Geometry polygon) {
        ArcFlattener flattener = new ArcFlattener(0.5 * tolerance);
        Geometry flat = flattener.flatten(polygon);
        PreparedGeometry prepared = PreparedGeometryFactory.prepare(flat);
        return s -> {
            LineString line = flattener.piece(start(s), end(s), section.circle(s));
            return prepared.covers(line) || isNearlyCovered(line, flat);
        };
    }

    /** Whether what the polygon leaves of a line is nowhere farther from it than snap. */
    private boolean isNearlyCovered(LineString line, Geometry polygon) {
        if (!polygon.getEnvelopeInternal().intersects(line.getEnvelopeInternal())
                && polygon.distance(line) > tolerance) {
            return false;
        }
        Geometry left = line.difference(polygon);
        for (int i = 0; i < left.getNumGeometries(); i++) {
            LineString part = (LineString) left.getGeometryN(i);
            if (!part.isEmpty()
                    && (isOff(part.getStartPoint(), polygon)
                            || isOff(part.getEndPoint(), polygon)
                            || isOff(part.getCentroid(), polygon))) {
                return false;
            }
        }
        return true;
    }

    private boolean isOff(Geometry point, Geometry polygon) {
        return point.distance(polygon) > tolerance;
    }

    private double distance(Coordinate point, int s) {
        Circle circle = section.circle(s);
        Coordinate a = start(s);
        Coordinate b = end(s);
        if (circle == null) {
            return Distance.pointToSegment(point, a, b);
        }
        double turn = circle.turn(a.x, a.y, b.x, b.y);
        double toPoint = Math.signum(turn) * circle.turn(a.x, a.y, point.x, point.y);
        return toPoint >= 0 && toPoint <= Math.abs(turn)
                ? Math.abs(circle.offset(point.x, point.y))
                : Math.min(point.distance(a), point.distance(b));
    }

    private void markNearest(Coordinate point, int[] sign) {
        List<int[]> runs = BoundaryRuns.of(section, boundary);
        int[] nearest = {};
        double least = Double.POSITIVE_INFINITY;
        for (int[] run : runs) {
            for (int s : run) {
                double distance = distance(point, s);
                if (distance < least) {
                    least = distance;
                    nearest = run;
                }
            }
        }
        for (int s : nearest) {
            if (sign[s] == 0) {
                sign[s] = outOfMaterial(s);
            }
        }
    }
}
