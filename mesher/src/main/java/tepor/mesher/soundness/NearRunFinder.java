package tepor.mesher.soundness;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.hprtree.HPRtree;
import org.locationtech.jts.index.strtree.STRtree;

/** Finds where borders come close without meeting, or run side by side. */
public final class NearRunFinder {
    /** A stretch shorter than this many gaps is only where borders part that meet. */
    private static final double LONG = 20;
    /** A strip along so much of the inner ring is there on purpose. */
    private static final double ALL_AROUND = 0.9;
    /** Borders this far apart, in gaps, have parted. */
    private static final double PARTED = 0.95;
    /** Of what parts for good, less than this share is narrower than half a gap. */
    private static final double WEDGE_NARROW = 0.8;
    /** Mean of the greatest width of what lies beside a circle that touches: a third, and room for coarse pieces. */
    private static final double TOUCHING_MEAN = 0.45;
    /** How far along its ring a piece must be from another, in gaps, to be near it for another reason. */
    private static final double APART = 4;

    private final DrawnPieces pieces;
    private final Closeness closeness;
    private final List<NearPair> pairs = new ArrayList<>();
    private final Map<Long, Integer> pairOf = new HashMap<>();
    private final double[] startOnRing;
    private int[] parent;

    /** Looks at all borders, for what is closer than {@link Closeness#gap}. */
    public NearRunFinder(DrawnPieces pieces, Closeness closeness) {
        this.pieces = pieces;
        this.closeness = closeness;
        startOnRing = new double[pieces.count()];
        for (int i = 1; i < startOnRing.length; i++) {
            startOnRing[i] = pieces.ring(i) == pieces.ring(i - 1) ? startOnRing[i - 1] + pieces.length(i - 1) : 0;
        }
        findPairs();
        join();
    }

    /** Pairs that come near, in no order that means anything. */
    List<NearPair> pairs() {
        return pairs;
    }

    /** The stretches, in the order of their pieces. */
    public List<NearRun> runs() {
        Map<Integer, List<NearPair>> groups = groups();
        List<NearRun> runs = new ArrayList<>();
        STRtree layers = new STRtree();
        for (List<NearPair> group : groups.values()) {
            if (sameRegion(group) && isLayer(group)) {
                runs.add(run(NearRun.Kind.LAYER, group));
                group.forEach(pair -> {
                    if (pair.middle != null) {
                        layers.insert(new Envelope(pair.middle.p0, pair.middle.p1), pair);
                    }
                });
            }
        }
        layers.build();
        for (List<NearPair> group : groups.values()) {
            if (sameRegion(group)) {
                if (!isLayer(group)) {
                    withinRegion(group, runs);
                }
            } else {
                betweenRegions(group, layers, runs);
            }
        }
        return runs;
    }

    private void findPairs() {
        HPRtree index = pieces.index();
        for (int i = 0; i < pieces.count(); i++) {
            int one = i;
            index.query(pieces.envelope(i, closeness.gap()), item -> {
                int other = (Integer) item;
                if (other > one && pieces.next(one) != other && pieces.previous(one) != other) {
                    NearPair.of(pieces, one, other, closeness).ifPresent(this::add);
                }
            });
        }
    }

    private void add(NearPair pair) {
        if (pieces.ring(pair.p) == pieces.ring(pair.q)) {
            pair.meets |= apart(pair.p, pair.q) <= APART * closeness.gap();
        }
        pairOf.put(key(pair.p, pair.q), pairs.size());
        pairs.add(pair);
    }

    /** The shorter way along a ring between two of its pieces, metres. */
    private double apart(int p, int q) {
        double ring = pieces.ringLength(pieces.ring(p));
        double forward = startOnRing[q] - startOnRing[p] - pieces.length(p);
        double back = ring - (startOnRing[q] + pieces.length(q)) + startOnRing[p];
        return Math.min(forward, back);
    }

    private static long key(int i, int j) {
        return ((long) Math.min(i, j) << 32) | Math.max(i, j);
    }

    private void join() {
        parent = new int[pairs.size()];
        for (int k = 0; k < parent.length; k++) {
            parent[k] = k;
        }
        for (int k = 0; k < parent.length; k++) {
            int p = pairs.get(k).p;
            int q = pairs.get(k).q;
            int[] besideP = {pieces.previous(p), p, pieces.next(p)};
            int[] besideQ = {pieces.previous(q), q, pieces.next(q)};
            for (int i : besideP) {
                for (int j : besideQ) {
                    Integer beside = pairOf.get(key(i, j));
                    if (beside != null) {
                        parent[root(k)] = root(beside);
                    }
                }
            }
        }
    }

    private int root(int k) {
        int at = k;
        while (parent[at] != at) {
            parent[at] = parent[parent[at]];
            at = parent[at];
        }
        return at;
    }

    private Map<Integer, List<NearPair>> groups() {
        Map<Integer, Integer> firstOf = new HashMap<>();
        Map<Integer, List<NearPair>> groups = new TreeMap<>();
        for (int k = 0; k < pairs.size(); k++) {
            int first = firstOf.computeIfAbsent(root(k), r -> firstOf.size());
            groups.computeIfAbsent(first, f -> new ArrayList<>()).add(pairs.get(k));
        }
        return groups;
    }

    private boolean sameRegion(List<NearPair> group) {
        return pieces.region(group.get(0).p) == pieces.region(group.get(0).q);
    }

    private boolean sameRing(List<NearPair> group) {
        return pieces.ring(group.get(0).p) == pieces.ring(group.get(0).q);
    }

    /** Whether the region itself lies between, thin and long. */
    private boolean isLayer(List<NearPair> group) {
        return between(group) == NearPair.Between.OVERLAP && length(group) >= LONG * width(group);
    }

    private static NearPair.Between between(List<NearPair> group) {
        Map<NearPair.Between, Double> lengths = new EnumMap<>(NearPair.Between.class);
        group.forEach(pair -> lengths.merge(pair.between, pair.length, Double::sum));
        NearPair.Between longest = NearPair.Between.POINT;
        for (Map.Entry<NearPair.Between, Double> entry : lengths.entrySet()) {
            if (entry.getValue() > lengths.getOrDefault(longest, 0.0)) {
                longest = entry.getKey();
            }
        }
        return longest;
    }

    private static double length(List<NearPair> group) {
        return group.stream().mapToDouble(pair -> pair.length).sum();
    }

    private static double width(List<NearPair> group) {
        return group.stream().mapToDouble(pair -> pair.width).min().orElse(Double.NaN);
    }

    private static double endDistance(List<NearPair> group) {
        return group.stream()
                .mapToDouble(pair -> pair.endDistance)
                .filter(d -> !Double.isNaN(d))
                .min()
                .orElse(Double.NaN);
    }

    /**
     * Whether borders that meet part for good, as sides do at a sharp corner, or circles that touch: no gap, however sharp.
     * A gap keeps its width over most of its length; of a wedge half is narrower than half its greatest width, and beside a
     * circle that touches the mean width is a third of the greatest.
     */
    private boolean isWedge(List<NearPair> group) {
        if (!meets(group)) {
            return false;
        }
        double widest = group.stream().mapToDouble(pair -> pair.widest).max().orElse(0);
        double narrow = 0;
        double area = 0;
        boolean bent = false;
        for (NearPair pair : group) {
            narrow += pair.widest < 0.5 * closeness.gap() ? pair.length : 0;
            area += pair.middle == null ? 0 : 0.5 * (pair.width + pair.widest) * pair.length;
            bent |= pieces.circle(pair.p) != null || pieces.circle(pair.q) != null;
        }
        boolean parts = widest >= PARTED * closeness.gap() && narrow < WEDGE_NARROW * length(group);
        return parts || (bent && area <= TOUCHING_MEAN * widest * length(group));
    }

    private static boolean meets(List<NearPair> group) {
        return group.stream().anyMatch(pair -> pair.meets);
    }

    private void withinRegion(List<NearPair> group, List<NearRun> runs) {
        boolean isLong = length(group) >= LONG * closeness.gap();
        if (isWedge(group)) {
            return;
        }
        boolean isSlit = between(group) == NearPair.Between.GAP && (isLong || !meets(group) && length(group) > 0);
        boolean isNear = !meets(group) && (!sameRing(group) || !Double.isNaN(endDistance(group)));
        if (isSlit && (isLong || !sameRing(group))) {
            runs.add(run(NearRun.Kind.SLIT, group));
        } else if (isNear) {
            runs.add(run(NearRun.Kind.NEAR_POINT, group));
        }
    }

    private void betweenRegions(List<NearPair> group, STRtree layers, List<NearRun> runs) {
        List<NearPair> open = new ArrayList<>();
        boolean meets = meets(group);
        for (NearPair pair : group) {
            if (isWithinLayer(pair, layers)) {
                meets = true;
            } else {
                open.add(pair);
            }
        }
        if (open.isEmpty()) {
            return;
        }
        if (meets && isWedge(open)) {
            return;
        }
        boolean isLong = length(open) >= LONG * closeness.gap();
        boolean endsNear = !Double.isNaN(endDistance(open)) && (open.size() == group.size());
        if (meets && !isLong && !endsNear) {
            return;
        }
        NearPair.Between between = between(open);
        NearRun.Kind kind = switch (between) {
            case POINT -> NearRun.Kind.NEAR_POINT;
            case GAP -> NearRun.Kind.GAP;
            case OVERLAP -> NearRun.Kind.OVERLAP;
            case STRIP_OF_P, STRIP_OF_Q -> isAllAround(open, between) ? NearRun.Kind.LAYER : NearRun.Kind.STRIP;
        };
        runs.add(run(length(open) < LONG * width(open) ? NearRun.Kind.NEAR_POINT : kind, open));
    }

    private boolean isAllAround(List<NearPair> group, NearPair.Between between) {
        NearPair any = group.get(0);
        int inner = between == NearPair.Between.STRIP_OF_P ? any.q : any.p;
        return length(group) >= ALL_AROUND * pieces.ringLength(pieces.ring(inner));
    }

    /** Whether the middle between two pieces lies in a thin region. */
    private boolean isWithinLayer(NearPair pair, STRtree layers) {
        if (layers.isEmpty()) {
            return false;
        }
        Coordinate at = pair.middle == null ? pair.nearest : pair.middle.midPoint();
        Envelope around = new Envelope(at);
        around.expandBy(closeness.gap());
        for (Object item : layers.query(around)) {
            NearPair layer = (NearPair) item;
            if (layer.middle.distance(at) <= 0.55 * layer.width + closeness.snap()) {
                return true;
            }
        }
        return false;
    }

    private NearRun run(NearRun.Kind kind, List<NearPair> group) {
        NearPair narrowest = null;
        for (NearPair pair : group) {
            if (pair.middle != null && (narrowest == null || pair.width < narrowest.width)) {
                narrowest = pair;
            }
        }
        int p = pieces.region(group.get(0).p);
        int q = pieces.region(group.get(0).q);
        double width = narrowest == null ? Double.POSITIVE_INFINITY : narrowest.width;
        Coordinate place = narrowest == null ? null : narrowest.middle.midPoint();
        if (kind == NearRun.Kind.NEAR_POINT) {
            for (NearPair pair : group) {
                double distance = Double.isNaN(pair.endDistance) ? pair.distance : pair.endDistance;
                if (distance > closeness.snap() && distance < width) {
                    width = distance;
                    place = pair.endPlace == null ? pair.nearest : pair.endPlace;
                }
            }
        }
        if (place == null) {
            place = group.get(0).nearest;
            width = group.get(0).distance;
        }
        double cost = group.stream().mapToDouble(pair -> pair.lengthOverWidth).sum();
        double widest = group.stream().mapToDouble(pair -> pair.widest).max().orElse(0);
        double most = kind == NearRun.Kind.NEAR_POINT ? width : Math.max(width, widest);
        return new NearRun(kind, Math.min(p, q), Math.max(p, q), width, most, length(group), cost, place, group);
    }
}
