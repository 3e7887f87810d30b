package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;

/** Makes areas and lines of strands as they were drawn. */
public final class Chainer {
    private Chainer() {}

    /**
     * Chains strands whose ends meet.
     *
     * @param drawn in the order drawn
     * @param snap distance within which two points are one, metres, greater than zero
     */
    public static Chained chain(List<Strand> drawn, double snap) {
        GeometryFactory factory = new GeometryFactory();
        List<Strand> loops = new ArrayList<>();
        List<Strand> open = new ArrayList<>();
        int tooShort = 0;
        int firstTooShort = 0;
        for (Strand strand : drawn) {
            Coordinate first = strand.first();
            if (strand.points().stream().allMatch(p -> p.distance(first) <= snap)) {
                tooShort++;
                firstTooShort = firstTooShort == 0 ? strand.source() : firstTooShort;
            } else if (strand.pieceCount() > 2 && strand.last().distance(first) <= snap) {
                loops.add(strand.withEnds(first, first));
            } else {
                open.add(strand);
            }
        }
        Overlaps overlaps = Overlaps.resolve(open, snap);
        StrandGraph graph = new StrandGraph(overlaps.strands(), snap);
        LoopFinder finder = new LoopFinder(graph);
        loops.addAll(graph.closed());
        loops.addAll(finder.loops());
        loops.sort(Comparator.comparingInt(Strand::source));
        LoopNesting nesting = new LoopNesting(loops, snap);
        List<Chained.Area> areas = nesting.areas(factory);

        List<Chained.Line> lines = new ArrayList<>();
        List<Strand> loose = new ArrayList<>();
        for (List<Integer> chain : finder.open()) {
            Strand joined = graph.join(chain);
            lines.add(new Chained.Line(joined.line(factory), joined.source()));
            boolean free = graph.leaving(graph.from(chain.get(0))).size() == 1
                    && graph.leaving(graph.to(chain.get(chain.size() - 1))).size() == 1;
            if (free) {
                loose.add(joined);
            }
        }
        lines.sort(Comparator.comparingInt(Chained.Line::source));
        int firstDoubled =
                overlaps.firstDoubled() == null ? 0 : overlaps.firstDoubled().source();
        for (Strand loop : nesting.doubled()) {
            firstDoubled = firstDoubled == 0 ? loop.source() : Math.min(firstDoubled, loop.source());
        }
        return new Chained(
                areas,
                lines,
                overlaps.doubled() + nesting.doubled().size(),
                firstDoubled,
                new GapFinder(loose).gaps(),
                finder.branches(),
                tooShort,
                firstTooShort);
    }
}
