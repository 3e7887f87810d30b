package tepor.mesher.refinement;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Cavity;
import tepor.mesher.triangulation.Predicates;
import tepor.mesher.triangulation.TriangleWalk;
import tepor.mesher.triangulation.Triangulation;

/**
 * Refines the constrained Delaunay triangulation of a section until angles and sizes are as asked.
 *
 * <p>Ruppert's algorithm (1995, J. Algorithms 18:548–585) with Üngör's off-centres (2009, Comput. Geom. 42:109–118): split
 * subsegments that are too long or encroached; then put vertices into triangles too sharp or too large, unless they
 * encroach on a subsegment, which is split instead. Small angles of the outline: {@link SmallAngles}. Ends for every input,
 * as no side becomes shorter than the smallest length.
 */
public final class SectionRefiner {
    /** Smallest length of a side as a part of the extent. */
    private static final double SMALLEST_PART = 1e-11;
    /** Smallest length of a side in units in the last place of the coordinates. */
    private static final double SMALLEST_ULPS = 256;

    /** How often the split of an arc waits for that of another. */
    private static final int DELAYS_AT_MOST = 8;

    private static final int STEPS_BETWEEN_CHECKS = 1024;

    private final Triangulation mesh;
    private final Section section;
    private final RefinementOptions options;
    private final BooleanSupplier stopped;
    private final Vertices vertices;
    private final TriangleRule triangleRule;
    private final SubsegmentRule subsegmentRule;
    private final SmallAngles smallAngles;
    private final TriangleWalk walk;
    private final Cavity cavity;
    private final PendingTriangles triangles;
    private final PendingSubsegments subsegments = new PendingSubsegments();
    private final Set<Long> unsplittable = new HashSet<>();
    private final Map<Long, Integer> delays = new HashMap<>();
    private final double smallestLength;
    private int steps;

    private SectionRefiner(
            Triangulation mesh,
            Section section,
            RefinementOptions options,
            Predicates predicates,
            BooleanSupplier stopped) {
        this.mesh = mesh;
        this.section = section;
        this.options = options;
        this.stopped = stopped;
        smallestLength = smallestLength(section);
        vertices = new Vertices(mesh, options.size());
        smallAngles = new SmallAngles(section);
        triangleRule = new TriangleRule(mesh, vertices, options);
        subsegmentRule = new SubsegmentRule(
                mesh, vertices, options.size(), section, smallAngles, smallestLength, options.greatestTurn());
        walk = new TriangleWalk(mesh, predicates);
        cavity = new Cavity(mesh, predicates);
        triangles = new PendingTriangles(section.extent());
    }

    /**
     * Refines a triangulation in place.
     *
     * @param mesh the carved triangulation of the section
     * @param stopped asked now and then whether to stop
     * @return where it stopped short
     * @throws CancellationException if told to stop
     */
    public static RefinementReport refine(
            Triangulation mesh,
            Section section,
            RefinementOptions options,
            Predicates predicates,
            BooleanSupplier stopped) {
        return new SectionRefiner(mesh, section, options, predicates, stopped).run();
    }

    private static double smallestLength(Section section) {
        double[] box = section.bounds();
        double greatest = 0;
        for (double coordinate : box) {
            greatest = Math.max(greatest, Math.abs(coordinate));
        }
        return Math.max(SMALLEST_PART * section.extent(), SMALLEST_ULPS * Math.ulp(greatest));
    }

    private RefinementReport run() {
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            checkSubsegment(side);
        }
        for (int t = 0; t < mesh.triangleCount(); t++) {
            checkTriangle(t);
        }
        boolean limited = refineQueued();
        while (!limited && section.hasArcs() && queueBowed()) {
            limited = refineQueued();
        }
        return StopFinder.find(mesh, vertices, triangleRule, smallAngles, limited);
    }

    /** Works until nothing waits; whether the greatest number of triangles ended it. */
    private boolean refineQueued() {
        boolean busy = true;
        while (busy) {
            if (steps++ % STEPS_BETWEEN_CHECKS == 0 && stopped.getAsBoolean()) {
                throw new CancellationException("meshing was told to stop");
            }
            // An interior vertex adds two triangles.
            if (mesh.triangleCount() + 2 > options.trianglesAtMost()) {
                return true;
            }
            busy = splitNextSubsegment() || betterNextTriangle();
        }
        return false;
    }

    /** Queues arcs that bow too far for the triangles beside them; whether there are any. */
    private boolean queueBowed() {
        boolean found = false;
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            if (subsegmentRule.bowsTooFar(side) && !unsplittable.contains(key(side))) {
                subsegments.add(side, mesh.version(side / 3));
                found = true;
            }
        }
        return found;
    }

    private void checkSubsegment(int side) {
        if (mesh.constraint(side) >= 0 && subsegmentRule.isBad(side)) {
            subsegments.add(side, mesh.version(side / 3));
        }
    }

    private void checkTriangle(int triangle) {
        triangleRule.examine(triangle);
        if (triangleRule.isLarge() || (triangleRule.isSharp() && !isImposed(triangle))) {
            triangles.add(triangle, mesh.version(triangle), triangleRule.shortestSquared());
        }
    }

    private boolean isImposed(int triangle) {
        return StopFinder.isImposed(mesh, vertices, triangleRule, smallAngles, triangle);
    }

    private boolean splitNextSubsegment() {
        int side = subsegments.take();
        if (side < 0) {
            return false;
        }
        if (mesh.version(side / 3) == subsegments.takenVersion() && !unsplittable.contains(key(side))) {
            int segment = mesh.constraint(side) / 2;
            if (!subsegmentRule.place(side)) {
                unsplittable.add(key(side));
            } else if (subsegmentRule.isArc(side)) {
                splitArc(side, segment);
            } else if (cavity.digSplit(subsegmentRule.x(), subsegmentRule.y(), side)) {
                insert(subsegmentRule.x(), subsegmentRule.y(), segment);
            } else {
                unsplittable.add(key(side));
            }
        }
        return true;
    }

    private void splitArc(int side, int segment) {
        if (cavity.digAside(subsegmentRule.x(), subsegmentRule.y(), side)) {
            insert(subsegmentRule.x(), subsegmentRule.y(), segment);
            cavity.restore(this::checkAll);
            return;
        }
        // Another arc's chord is in the way: that one is split first.
        int hindrance = cavity.hindrance();
        boolean wait = mesh.constraint(hindrance) >= 0
                && !unsplittable.contains(key(hindrance))
                && delays.merge(key(side), 1, Integer::sum) <= DELAYS_AT_MOST;
        if (wait) {
            subsegments.add(hindrance, mesh.version(hindrance / 3));
            subsegments.add(side, mesh.version(side / 3));
        } else {
            unsplittable.add(key(side));
        }
    }

    private void checkAll(int firstSide) {
        for (int side = firstSide; side < firstSide + 3; side++) {
            checkSubsegment(side);
        }
        checkTriangle(firstSide / 3);
    }

    private long key(int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        return (long) Math.max(a, b) << 32 | Math.min(a, b);
    }

    private boolean betterNextTriangle() {
        int triangle = triangles.take();
        if (triangle < 0) {
            return false;
        }
        if (mesh.version(triangle) != triangles.takenVersion()) {
            return true;
        }
        triangleRule.examine(triangle);
        double shortestSquared = triangleRule.shortestSquared();
        if (shortestSquared < smallestLength * smallestLength || !triangleRule.place()) {
            return true;
        }
        double x = triangleRule.x();
        double y = triangleRule.y();
        boolean again = false;
        switch (walk.walk(triangle, x, y)) {
            case INSIDE -> again = insertFree(x, y, walk.triangle());
            case ON_SIDE ->
                again = mesh.constraint(walk.side()) >= 0 ? demand(walk.side()) : insertFree(x, y, walk.triangle());
            case BLOCKED -> again = demand(walk.side());
            case ON_CORNER -> again = false;
        }
        if (again) {
            triangles.add(triangle, mesh.version(triangle), shortestSquared);
        }
        return true;
    }

    // Whether the triangle must be tried again, since subsegments are to be split first.
    private boolean insertFree(double x, double y, int triangle) {
        cavity.dig(x, y, triangle);
        boolean encroaches = false;
        boolean demanded = false;
        for (int i = 0; i < cavity.borderCount(); i++) {
            int side = cavity.borderSide(i);
            if (mesh.constraint(side) >= 0 && subsegmentRule.isEncroachedBy(side, x, y)) {
                encroaches = true;
                demanded |= demand(side);
            }
        }
        if (!encroaches) {
            insert(x, y, Vertices.FREE);
        }
        return demanded;
    }

    private boolean demand(int side) {
        if (unsplittable.contains(key(side))) {
            return false;
        }
        subsegments.add(side, mesh.version(side / 3));
        return true;
    }

    private void insert(double x, double y, int segment) {
        cavity.fill(vertices.add(x, y, segment));
        for (int i = 0; i < cavity.borderCount(); i++) {
            int side = cavity.borderSide(i);
            checkAll(side);
        }
    }
}
