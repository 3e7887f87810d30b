package tepor.mesher.refinement;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.Section;

/**
 * Where segments of a section meet under less than 60° with material between them.
 *
 * <p>There two rules keep refinement from running away: segments are cut at equal distances from the apex, and a sharp
 * triangle whose shortest side joins both segments at equal distance is left alone. Sources: Ruppert 1995, J. Algorithms
 * 18:548–585 (shells); Miller, Pav & Walkington 2003, <em>When and why Ruppert's algorithm works</em>, IMR (triangles left
 * alone). Segments that continue each other straight or on the same circle count as one line; angles at arcs are those of
 * their tangents, or of their chords where these are smaller.
 */
public final class SmallAngles {
    private static final double SMALL = Math.PI / 3 - 1e-9;
    /**
     * Corners between these angles are cut at shells too: halved towards such a corner, two segments may encroach on each
     * other without end when 33° are asked. Right angles do as well, and with fewer triangles, without.
     */
    private static final double CORNER_LEAST = Math.toRadians(80);

    private static final double CORNER_GREATEST = Math.toRadians(160);
    private static final double ABOUT_RIGHT = Math.toRadians(0.1);
    private static final double STRAIGHT = 1e-6;
    /** Distances from the apex that differ by less than this part are equal. */
    private static final double EQUAL = 1e-3;
    /** The same where one of the lines is bent: halves of arcs between shells differ by their curvature. */
    private static final double EQUAL_ON_ARCS = 0.05;

    private final Section section;
    private final int[] line;
    private final int[][] linesAt;
    private final boolean[] apexAtEnd;
    private final boolean[] cornerAtEnd;
    private final boolean[] sharpLine;
    private final boolean[] bentLine;
    private final Map<Long, int[]> apexesOf = new HashMap<>();

    /**
     * A segment as seen from one of its ends.
     *
     * @param direction of its chord
     * @param bend from its chord to its tangent, positive counter-clockwise; 0 for a straight segment
     */
    private record Spoke(int segment, boolean outward, double direction, double bend) {}

    /** Looks at all vertices of the section. */
    public SmallAngles(Section section) {
        this.section = section;
        int segments = section.segmentCount();
        line = new int[segments];
        Arrays.setAll(line, s -> s);
        apexAtEnd = new boolean[2 * segments];
        cornerAtEnd = new boolean[2 * segments];
        sharpLine = new boolean[segments];
        linesAt = new int[section.vertexCount()][];
        List<List<Spoke>> spokes = spokes();
        spokes.forEach(this::joinStraight);
        bentLine = new boolean[segments];
        for (int s = 0; s < segments; s++) {
            line[s] = root(s);
            bentLine[line[s]] |= section.circle(s) != null;
        }
        for (int v = 0; v < spokes.size(); v++) {
            linesAt[v] = linesOf(spokes.get(v));
            findApex(v, spokes.get(v));
        }
    }

    /** Whether two segments, or lines that they are part of, meet under a small angle with material in it. */
    public boolean meet(int segment, int other) {
        return line[segment] != line[other] && apexesOf.containsKey(pair(line[segment], line[other]));
    }

    /** Whether the segment meets another under a small angle at this vertex of the section. */
    boolean isApex(int segment, int vertex) {
        return (section.start(segment) == vertex && apexAtEnd[2 * segment])
                || (section.end(segment) == vertex && apexAtEnd[2 * segment + 1]);
    }

    /** Whether the segment meets another at this vertex under 80° to 160°, not 90°, with material between them. */
    boolean isCorner(int segment, int vertex) {
        return (section.start(segment) == vertex && cornerAtEnd[2 * segment])
                || (section.end(segment) == vertex && cornerAtEnd[2 * segment + 1]);
    }

    /** Whether the segment, or one that continues it straight, meets another under a small angle at any end. */
    boolean isSharp(int segment) {
        return sharpLine[line[segment]];
    }

    /**
     * Whether a side joins two lines that meet under a small angle, at equal distances from their apex.
     *
     * @param p vertex at one end of the side
     * @param q vertex at the other end
     */
    boolean joinsShells(Vertices vertices, int p, int q) {
        int pSegment = vertices.carrier(p);
        int qSegment = vertices.carrier(q);
        if (pSegment == Vertices.FREE || qSegment == Vertices.FREE || apexesOf.isEmpty()) {
            return false;
        }
        int pCount = pSegment >= 0 ? 1 : linesAt[p].length;
        int qCount = qSegment >= 0 ? 1 : linesAt[q].length;
        for (int i = 0; i < pCount; i++) {
            int pLine = pSegment >= 0 ? line[pSegment] : linesAt[p][i];
            for (int j = 0; j < qCount; j++) {
                int qLine = qSegment >= 0 ? line[qSegment] : linesAt[q][j];
                boolean may = pLine != qLine && sharpLine[pLine] && sharpLine[qLine];
                int[] apexes = may ? apexesOf.get(pair(pLine, qLine)) : null;
                if (apexes != null && isShell(vertices, apexes, pLine, qLine, p, q)) {
                    return true;
                }
            }
        }
        return false;
    }

    /**
     * Whether a vertex lies on another line than a segment, the two lines meet under a small angle somewhere, and one of them
     * is bent.
     */
    boolean isBesideBend(Vertices vertices, int segment, int vertex) {
        int carrier = vertices.carrier(vertex);
        if (carrier == Vertices.FREE || apexesOf.isEmpty()) {
            return false;
        }
        int own = line[segment];
        int count = carrier >= 0 ? 1 : linesAt[vertex].length;
        boolean beside = false;
        for (int i = 0; i < count; i++) {
            int other = carrier >= 0 ? line[carrier] : linesAt[vertex][i];
            if (other == own) {
                return false;
            }
            beside |= (bentLine[own] || bentLine[other]) && apexesOf.containsKey(pair(own, other));
        }
        return beside;
    }

    private boolean isShell(Vertices vertices, int[] apexes, int pLine, int qLine, int p, int q) {
        double equal = bentLine[pLine] || bentLine[qLine] ? EQUAL_ON_ARCS : EQUAL;
        for (int apex : apexes) {
            double toP = vertices.distance(apex, p);
            double toQ = vertices.distance(apex, q);
            if (apex != p && apex != q && Math.abs(toP - toQ) <= equal * Math.max(toP, toQ)) {
                return true;
            }
        }
        return false;
    }

    private List<List<Spoke>> spokes() {
        List<List<Spoke>> spokes = new ArrayList<>();
        for (int v = 0; v < section.vertexCount(); v++) {
            spokes.add(new ArrayList<>(2));
        }
        for (int s = 0; s < section.segmentCount(); s++) {
            if (section.solidLeft(s) || section.solidRight(s)) {
                int a = section.start(s);
                int b = section.end(s);
                double dx = section.x(b) - section.x(a);
                double dy = section.y(b) - section.y(a);
                Circle circle = section.circle(s);
                double half =
                        circle == null ? 0 : 0.5 * circle.turn(section.x(a), section.y(a), section.x(b), section.y(b));
                spokes.get(a).add(new Spoke(s, true, Math.atan2(dy, dx), -half));
                spokes.get(b).add(new Spoke(s, false, Math.atan2(-dy, -dx), half));
            }
        }
        spokes.forEach(list -> list.sort(Comparator.comparingDouble(Spoke::direction)));
        return spokes;
    }

    // A line and an arc that goes on from it are two: round a plate with rounded corners all would be one line, that
    // meets
    // itself.
    private void joinStraight(List<Spoke> spokes) {
        for (int i = 0; i < spokes.size(); i++) {
            for (int j = i + 1; j < spokes.size(); j++) {
                Spoke a = spokes.get(i);
                Spoke b = spokes.get(j);
                Circle circle = section.circle(a.segment());
                double turn = Math.abs(b.direction() - a.direction());
                if (Objects.equals(circle, section.circle(b.segment()))
                        && (circle != null || Math.abs(turn - Math.PI) < STRAIGHT)) {
                    line[root(a.segment())] = root(b.segment());
                }
            }
        }
    }

    private void findApex(int vertex, List<Spoke> spokes) {
        for (int i = 0; i < spokes.size() && spokes.size() > 1; i++) {
            Spoke a = spokes.get(i);
            Spoke b = spokes.get((i + 1) % spokes.size());
            double turn = b.direction() - a.direction();
            double ofChords = turn < 0 ? turn + 2 * Math.PI : turn;
            double ofTangents = ofChords + b.bend() - a.bend();
            double angle = Math.min(ofChords, ofTangents);
            // Between a and b, counter-clockwise, lies what is on the left of a seen outward.
            boolean solid = a.outward() ? section.solidLeft(a.segment()) : section.solidRight(a.segment());
            boolean right = Math.abs(ofTangents - Math.PI / 2) < ABOUT_RIGHT;
            if (ofTangents > CORNER_LEAST && ofTangents < CORNER_GREATEST && !right && solid) {
                cornerAtEnd[2 * a.segment() + (a.outward() ? 0 : 1)] = true;
                cornerAtEnd[2 * b.segment() + (b.outward() ? 0 : 1)] = true;
            }
            if (angle < SMALL && solid) {
                apexAtEnd[2 * a.segment() + (a.outward() ? 0 : 1)] = true;
                apexAtEnd[2 * b.segment() + (b.outward() ? 0 : 1)] = true;
                sharpLine[line[a.segment()]] = true;
                sharpLine[line[b.segment()]] = true;
                apexesOf.merge(pair(line[a.segment()], line[b.segment()]), new int[] {vertex}, SmallAngles::joined);
            }
        }
    }

    private static int[] joined(int[] some, int[] more) {
        int[] all = Arrays.copyOf(some, some.length + more.length);
        System.arraycopy(more, 0, all, some.length, more.length);
        return all;
    }

    private int[] linesOf(List<Spoke> spokes) {
        int[] lines = new int[spokes.size()];
        int count = 0;
        for (int i = 0; i < lines.length; i++) {
            int own = line[spokes.get(i).segment()];
            boolean known = false;
            for (int j = 0; j < count; j++) {
                known |= lines[j] == own;
            }
            if (!known) {
                lines[count++] = own;
            }
        }
        return Arrays.copyOf(lines, count);
    }

    private int root(int segment) {
        int r = segment;
        while (line[r] != r) {
            r = line[r];
        }
        line[segment] = r;
        return r;
    }

    private static long pair(int a, int b) {
        // The factor spreads the hashes of neighbouring numbers.
        return ((long) Math.max(a, b) << 32 | Math.min(a, b)) * 0x9E3779B97F4A7C15L;
    }
}
