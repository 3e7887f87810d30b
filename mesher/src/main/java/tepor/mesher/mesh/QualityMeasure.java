package tepor.mesher.mesh;

import java.util.BitSet;
import tepor.mesher.refinement.SmallAngles;
import tepor.mesher.section.Section;

/** Measures the angles of a mesh, and tells those the outline imposes from those that were made. */
final class QualityMeasure {
    private final Mesh mesh;
    private final SmallAngles smallAngles;
    /** Where the facets at each corner begin in the list that follows, and their segments. */
    private final int[] firstAt;

    private final int[] segmentAt;
    /** Sides 3·triangle + i that are facets. */
    private final BitSet facetSides = new BitSet();

    private QualityMeasure(Mesh mesh, Section section) {
        this.mesh = mesh;
        smallAngles = new SmallAngles(section);
        firstAt = new int[mesh.cornerCount() + 1];
        segmentAt = new int[2 * mesh.facetCount()];
        for (int f = 0; f < mesh.facetCount(); f++) {
            firstAt[mesh.facetNode(f, 0)]++;
            firstAt[mesh.facetNode(f, 1)]++;
            if (mesh.facetLeftTriangle(f) != Mesh.NONE) {
                facetSides.set(3 * mesh.facetLeftTriangle(f) + mesh.facetLeftSide(f));
            }
            if (mesh.facetRightTriangle(f) != Mesh.NONE) {
                facetSides.set(3 * mesh.facetRightTriangle(f) + mesh.facetRightSide(f));
            }
        }
        // From numbers to ends of the lists; filling them from behind turns the ends into beginnings.
        for (int n = 0; n < mesh.cornerCount(); n++) {
            firstAt[n + 1] += firstAt[n];
        }
        for (int f = 0; f < mesh.facetCount(); f++) {
            segmentAt[--firstAt[mesh.facetNode(f, 0)]] = mesh.facetSegment(f);
            segmentAt[--firstAt[mesh.facetNode(f, 1)]] = mesh.facetSegment(f);
        }
    }

    static MeshQuality measure(Mesh mesh, Section section) {
        return new QualityMeasure(mesh, section).measure();
    }

    // Compares cotangents, which fall as angles grow from 0 to 180°.
    private MeshQuality measure() {
        double smallest = Double.NEGATIVE_INFINITY;
        double smallestMade = Double.NEGATIVE_INFINITY;
        double largest = Double.POSITIVE_INFINITY;
        double[] cotangent = new double[3];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            findCotangents(t, cotangent);
            int leastCorner = cotangent[0] >= cotangent[1] ? 0 : 1;
            leastCorner = cotangent[leastCorner] >= cotangent[2] ? leastCorner : 2;
            double least = cotangent[leastCorner];
            largest = Math.min(largest, Math.min(cotangent[0], Math.min(cotangent[1], cotangent[2])));
            smallest = Math.max(smallest, least);
            // The shortest side lies opposite the smallest angle.
            if (least > smallestMade && !joinsSmallAngle(t, leastCorner)) {
                for (int i = 0; i < 3; i++) {
                    if (cotangent[i] > smallestMade && !isBetweenSegments(t, i)) {
                        smallestMade = cotangent[i];
                    }
                }
            }
        }
        return new MeshQuality(angle(smallest), angle(smallestMade), angle(largest));
    }

    private static double angle(double cotangent) {
        return Math.PI / 2 - Math.atan(cotangent);
    }

    private void findCotangents(int t, double[] cotangent) {
        int a = mesh.node(t, 0);
        int b = mesh.node(t, 1);
        int c = mesh.node(t, 2);
        double abX = mesh.x(b) - mesh.x(a);
        double abY = mesh.y(b) - mesh.y(a);
        double bcX = mesh.x(c) - mesh.x(b);
        double bcY = mesh.y(c) - mesh.y(b);
        double caX = mesh.x(a) - mesh.x(c);
        double caY = mesh.y(a) - mesh.y(c);
        double cross = abX * bcY - bcX * abY;
        cotangent[0] = -(abX * caX + abY * caY) / cross;
        cotangent[1] = -(bcX * abX + bcY * abY) / cross;
        cotangent[2] = -(caX * bcX + caY * bcY) / cross;
    }

    private boolean isBetweenSegments(int t, int i) {
        return facetSides.get(3 * t + (i + 1) % 3) && facetSides.get(3 * t + (i + 2) % 3);
    }

    private boolean joinsSmallAngle(int t, int corner) {
        int a = mesh.node(t, (corner + 1) % 3);
        int b = mesh.node(t, (corner + 2) % 3);
        for (int i = firstAt[a]; i < firstAt[a + 1]; i++) {
            for (int j = firstAt[b]; j < firstAt[b + 1]; j++) {
                if (smallAngles.meet(segmentAt[i], segmentAt[j])) {
                    return true;
                }
            }
        }
        return false;
    }
}
