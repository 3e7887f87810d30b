package tepor.solver.bracket;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

/** Moves a line over pieces that each span an interval of one coordinate, and stops wherever a piece begins or ends. */
final class Sweep {
    private Sweep() {}

    /**
     * Makes ends that lie closer together than a tolerance one and the same, so that rounding leaves no slivers of intervals
     * to stop at.
     *
     * @param low changed in place
     * @param high changed in place
     * @param count how many entries of both to look at
     */
    static void join(double[] low, double[] high, int count, double tolerance) {
        double[] ends = DoubleStream.concat(Arrays.stream(low, 0, count), Arrays.stream(high, 0, count))
                .sorted()
                .toArray();
        int kept = 0;
        for (double end : ends) {
            if (kept == 0 || end - ends[kept - 1] > tolerance) {
                ends[kept++] = end;
            }
        }
        for (int i = 0; i < count; i++) {
            low[i] = atOrBelow(ends, kept, low[i]);
            high[i] = atOrBelow(ends, kept, high[i]);
        }
    }

    private static double atOrBelow(double[] ends, int count, double end) {
        int found = Arrays.binarySearch(ends, 0, count, end);
        return ends[found >= 0 ? found : -found - 2];
    }

    /** Told of each interval between two stops. */
    interface Visitor {
        /**
         * @param from begin of the interval
         * @param to end of the interval, above from
         * @param active pieces that span the whole interval; valid during the call
         * @param count how many of these there are
         */
        void interval(double from, double to, int[] active, int count);
    }

    /**
     * Sweeps from one coordinate to another.
     *
     * @param low where each piece begins
     * @param high where it ends, at or above low; a piece of no extent is never active
     * @param from where to begin
     * @param to where to end
     * @param visitor told of each interval
     */
    static void run(double[] low, double[] high, double from, double to, Visitor visitor) {
        double[] stops = DoubleStream.concat(Arrays.stream(low), Arrays.stream(high))
                .filter(stop -> stop > from && stop < to)
                .distinct()
                .sorted()
                .toArray();
        stops = Arrays.copyOf(stops, stops.length + 1);
        stops[stops.length - 1] = to;
        int[] order = IntStream.range(0, low.length)
                .boxed()
                .sorted(Comparator.comparingDouble(i -> low[i]))
                .mapToInt(Integer::intValue)
                .toArray();
        int[] active = new int[low.length];
        int count = 0;
        int next = 0;
        double begin = from;
        for (double end : stops) {
            if (!(end > begin)) {
                continue;
            }
            while (next < order.length && low[order[next]] <= begin) {
                active[count++] = order[next++];
            }
            int kept = 0;
            for (int i = 0; i < count; i++) {
                if (high[active[i]] >= end) {
                    active[kept++] = active[i];
                }
            }
            count = kept;
            visitor.interval(begin, end, active, count);
            begin = end;
        }
    }
}
