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
        cell = 2 * reach;
    }

    /** Number of the nearest point within reach; a new one where there is none. */
    int number(Coordinate p) {
        long i = (long) Math.floor(p.x / cell);
        long j = (long) Math.floor(p.y / cell);
        int nearest = -1;
        double least = reach;
        for (long di = -1; di <= 1; di++) {
            for (long dj = -1; dj <= 1; dj++) {
                for (int candidate : cells.getOrDefault(new Cell(i + di, j + dj), List.of())) {
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
            cells.computeIfAbsent(new Cell(i, j), c -> new ArrayList<>()).add(nearest);
        }
        return nearest;
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
