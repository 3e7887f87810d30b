package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.locationtech.jts.algorithm.Distance;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.index.strtree.STRtree;
import org.locationtech.jts.operation.polygonize.Polygonizer;

/** Checks what must hold for every section, by means that the builder does not use. */
final class SectionAudit {
    private SectionAudit() {}

    static void check(Section section) {
        segmentsAreSeparate(section);
        sidesDiffer(section);
        facesAreOwnedAsTheSidesSay(section);
    }

    private static Coordinate[] ends(Section section, int s) {
        return new Coordinate[] {
            new Coordinate(section.x(section.start(s)), section.y(section.start(s))),
            new Coordinate(section.x(section.end(s)), section.y(section.end(s)))
        };
    }

    /** No segment twice; none touches another but at a common vertex; none passes a vertex closer than half a snap. */
    private static void segmentsAreSeparate(Section section) {
        Set<Long> seen = new HashSet<>();
        STRtree index = new STRtree();
        for (int s = 0; s < section.segmentCount(); s++) {
            assertThat(section.start(s)).isNotEqualTo(section.end(s));
            assertThat(seen.add(Border.key(section.start(s), section.end(s)))).isTrue();
            Coordinate[] c = ends(section, s);
            index.insert(new Envelope(c[0], c[1]), s);
        }
        for (int s = 0; s < section.segmentCount(); s++) {
            Coordinate[] c = ends(section, s);
            Envelope reach = new Envelope(c[0], c[1]);
            reach.expandBy(section.snap());
            List<?> near = index.query(reach);
            for (Object item : near) {
                int t = (Integer) item;
                if (t > s) {
                    checkPair(section, s, t);
                }
            }
        }
    }

    private static void checkPair(Section section, int s, int t) {
        Coordinate[] c = ends(section, s);
        Coordinate[] d = ends(section, t);
        Set<Integer> common = new HashSet<>(List.of(section.start(s), section.end(s)));
        common.retainAll(Set.of(section.start(t), section.end(t)));
        double distance;
        if (common.isEmpty()) {
            distance = Distance.segmentToSegment(c[0], c[1], d[0], d[1]);
        } else {
            int farOfT = common.contains(section.start(t)) ? section.end(t) : section.start(t);
            Coordinate far = new Coordinate(section.x(farOfT), section.y(farOfT));
            distance = Distance.pointToSegment(far, c[0], c[1]);
        }
        if (distance <= 0.5 * section.snap()) {
            fail("segments %d and %d are %s apart, and are not joined".formatted(s, t, distance));
        }
    }

    private static void sidesDiffer(Section section) {
        Set<Integer> used = new HashSet<>();
        for (int s = 0; s < section.segmentCount(); s++) {
            assertThat(section.left(s)).isNotEqualTo(section.right(s));
            assertThat(section.solidLeft(s) || section.solidRight(s)).isTrue();
            if (section.isOuter(s)) {
                assertThat(section.isBoundary(s)).isTrue();
            }
            used.add(section.start(s));
            used.add(section.end(s));
        }
        assertThat(used).hasSize(section.vertexCount());
    }

    /** Polygonizes the segments with JTS, and looks at each face from each of its sides. Checks Euler's formula too. */
    private static void facesAreOwnedAsTheSidesSay(Section section) {
        Polygonizer polygonizer = new Polygonizer();
        GeometryFactory factory = new GeometryFactory();
        STRtree index = new STRtree();
        for (int s = 0; s < section.segmentCount(); s++) {
            LineString line = factory.createLineString(ends(section, s));
            polygonizer.add(line);
            index.insert(line.getEnvelopeInternal(), s);
        }
        assertThat(polygonizer.getDangles().isEmpty()).isTrue();
        assertThat(polygonizer.getCutEdges().isEmpty()).isTrue();
        List<Polygon> faces = new ArrayList<>();
        for (Object face : polygonizer.getPolygons()) {
            faces.add((Polygon) face);
        }
        DisjointSets parts = new DisjointSets(section.vertexCount());
        int partCount = section.vertexCount();
        for (int s = 0; s < section.segmentCount(); s++) {
            partCount -= parts.find(section.start(s)) == parts.find(section.end(s)) ? 0 : 1;
            parts.join(section.start(s), section.end(s));
        }
        // Euler: V − E + F = 1 + C, the far outside being a face.
        assertThat(section.vertexCount() - section.segmentCount() + faces.size() + 1)
                .isEqualTo(1 + partCount);
        for (Polygon face : faces) {
            Set<Integer> owners = new HashSet<>();
            addOwners(section, face.getExteriorRing().getCoordinates(), index, owners);
            for (int h = 0; h < face.getNumInteriorRing(); h++) {
                addOwners(section, face.getInteriorRingN(h).getCoordinates(), index, owners);
            }
            owners.removeIf(r -> r == Section.NONE || section.isHole(r));
            assertThat(owners).as("owners of the face %s", face).hasSizeLessThanOrEqualTo(1);
        }
    }

    /** JTS gives shells clockwise and holes counterclockwise, so that the face lies on the right of each side. */
    private static void addOwners(Section section, Coordinate[] ring, STRtree index, Set<Integer> owners) {
        for (int i = 1; i < ring.length; i++) {
            List<?> near = index.query(new Envelope(ring[i - 1], ring[i]));
            for (Object item : near) {
                int s = (Integer) item;
                Coordinate[] c = ends(section, s);
                if (c[0].equals2D(ring[i - 1]) && c[1].equals2D(ring[i])) {
                    owners.add(section.right(s));
                } else if (c[1].equals2D(ring[i - 1]) && c[0].equals2D(ring[i])) {
                    owners.add(section.left(s));
                }
            }
        }
    }
}
