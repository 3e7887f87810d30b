package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import tepor.mesher.outline.Circle;

/** Makes areas and lines of strands as they were drawn. */
public final class Chainer {
    private Chainer() {}

    /** What tells whether a strand is the very copy of another, as blocks laid twice make them. */
    private record Shape(List<Coordinate> points, List<Circle> circles) {}

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
        Set<Shape> shapes = new HashSet<>();
        int copies = 0;
        int firstCopy = 0;
        for (Strand strand : drawn) {
            Coordinate first = strand.first();
            if (!shapes.add(new Shape(strand.points(), strand.circles()))) {
                copies++;
                firstCopy = firstCopy == 0 ? strand.source() : firstCopy;
            } else if (strand.points().stream().allMatch(p -> p.distance(first) <= snap)) {
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
        IntStream doubled = IntStream.concat(
                nesting.doubled().stream().mapToInt(Strand::source),
                overlaps.firstDoubled() == null
                        ? IntStream.empty()
                        : IntStream.of(overlaps.firstDoubled().source()));
        int firstDoubled = IntStream.concat(doubled, firstCopy == 0 ? IntStream.empty() : IntStream.of(firstCopy))
                .min()
                .orElse(0);
        return new Chained(
                areas,
                lines,
                copies + overlaps.doubled() + nesting.doubled().size(),
                firstDoubled,
                new GapFinder(loose).gaps(),
                finder.branches(),
                tooShort,
                firstTooShort);
    }
}
