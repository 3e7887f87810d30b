package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Coordinate;

/** Numbers points; those within a reach of one that has a number already get that number. */
final class PointGrid {
    private final double reach;
    private final double cell;
    private final Map<Cell, List<Integer>> cells = new HashMap<>();
    private final List<Coordinate> points = new ArrayList<>();

    private record Cell(long i, long j) {}

    /** @param reach metres, greater than zero */
    PointGrid(double reach) {
        this.reach = reach;
        // Wide cells, so that what is within reach seldom lies in several.
        cell = 8 * reach;
    }

    /** Number of the nearest point within reach; a new one where there is none. */
    int number(Coordinate p) {
        int nearest = -1;
        double least = reach;
        for (long i = index(p.x - reach); i <= index(p.x + reach); i++) {
            for (long j = index(p.y - reach); j <= index(p.y + reach); j++) {
                for (int candidate : cells.getOrDefault(new Cell(i, j), List.of())) {
                    double distance = points.get(candidate).distance(p);
                    if (distance < least || (distance == least && (nearest < 0 || candidate < nearest))) {
                        least = distance;
                        nearest = candidate;
                    }
                }
            }
        }
        if (nearest < 0) {
            nearest = points.size();
            points.add(p);
            cells.computeIfAbsent(new Cell(index(p.x), index(p.y)), c -> new ArrayList<>(1))
                    .add(nearest);
        }
        return nearest;
    }

    private long index(double coordinate) {
        return (long) Math.floor(coordinate / cell);
    }

    Coordinate point(int number) {
        return points.get(number);
    }

    /** Lets another point within reach stand for the number. */
    void setPoint(int number, Coordinate p) {
        points.set(number, p);
    }

    int size() {
        return points.size();
    }
}
