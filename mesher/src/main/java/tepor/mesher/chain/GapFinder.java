package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;

/** Finds loops that fail to close by little: chains each end of which is the other's nearest, round to where they began. */
final class GapFinder {
    /** Gaps that together are a greater share of the loop are no slips of the pen. */
    private static final double GREATEST_SHARE = 0.05;

    private final List<Strand> chains;
    private final Coordinate[] end;
    private final List<Chained.Gap> gaps = new ArrayList<>();

    /** @param chains open chains neither end of which meets anything */
    GapFinder(List<Strand> chains) {
        this.chains = chains;
        end = new Coordinate[2 * chains.size()];
        for (int c = 0; c < chains.size(); c++) {
            end[2 * c] = chains.get(c).first();
            end[2 * c + 1] = chains.get(c).last();
        }
        if (!chains.isEmpty()) {
            find();
        }
    }

    List<Chained.Gap> gaps() {
        return gaps;
    }

    private void find() {
        int[] nearest = nearest();
        BitSet seen = new BitSet();
        for (int c = 0; c < chains.size(); c++) {
            if (!seen.get(c)) {
                follow(c, nearest, seen);
            }
        }
    }

    private int[] nearest() {
        int[] nearest = new int[end.length];
        Arrays.fill(nearest, -1);
        if (end.length == 2) {
            nearest[0] = 1;
            nearest[1] = 0;
            return nearest;
        }
        STRtree index = new STRtree();
        for (int e = 0; e < end.length; e++) {
            index.insert(new Envelope(end[e]), e);
        }
        for (int e = 0; e < end.length; e++) {
            nearest[e] = (Integer) index.nearestNeighbour(new Envelope(end[e]), e, (a, b) -> {
                int i = (Integer) a.getItem();
                int j = (Integer) b.getItem();
                return i == j ? Double.MAX_VALUE : end[i].distance(end[j]);
            });
        }
        return nearest;
    }

    private void follow(int start, int[] nearest, BitSet seen) {
        List<Chained.Gap> found = new ArrayList<>();
        double width = 0;
        double length = 0;
        int at = 2 * start; // enters the chain by this end
        do {
            seen.set(at / 2);
            length += chains.get(at / 2).length();
            int leave = at ^ 1;
            int next = nearest[leave];
            if (nearest[next] != leave) {
                return;
            }
            found.add(new Chained.Gap(
                    end[leave],
                    end[next],
                    chains.get(leave / 2).source(),
                    chains.get(next / 2).source()));
            width += end[leave].distance(end[next]);
            at = next;
        } while (at != 2 * start);
        if (width <= GREATEST_SHARE * length) {
            gaps.addAll(found);
        }
    }
}
