package tepor.mesher.chain;

import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;

/**
 * What became of strands.
 *
 * @param areas what closed loops enclose
 * @param lines what is open
 * @param doubled how many strands, or loops, lay wholly or in part over earlier ones, and were taken once
 * @param firstDoubled source of the first of them; 0 where there is none
 * @param gaps where loops fail to close by little
 * @param branches points in which loops branch, so that it is not plain which is meant
 * @param tooShort how many strands were shorter than snap, and left out
 * @param firstTooShort source of the first of them; 0 where there is none
 */
public record Chained(
        List<Area> areas,
        List<Line> lines,
        int doubled,
        int firstDoubled,
        List<Gap> gaps,
        List<Coordinate> branches,
        int tooShort,
        int firstTooShort) {
    /** An area, and the line of the file in which its outer loop begins. */
    public record Area(Polygon polygon, int source) {}

    /** An open chain, and the line of the file in which its first strand was drawn. */
    public record Line(LineString line, int source) {}

    /** Two ends that a loop would need to meet, metres, and the lines of the file in which they were drawn. */
    public record Gap(Coordinate from, Coordinate to, int source, int otherSource) {
        public double width() {
            return from.distance(to);
        }
    }
}
