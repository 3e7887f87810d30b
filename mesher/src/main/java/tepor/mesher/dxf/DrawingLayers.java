package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import tepor.mesher.chain.Strand;

/** What is drawn on each layer, in the order drawn, coordinates in metres. */
final class DrawingLayers {
    private final Map<String, Content> byName = new LinkedHashMap<>();

    /** A point, and the line of the file in which it stands. */
    record Spot(Coordinate at, int source) {}

    /** What is on one layer. */
    record Content(List<Strand> strands, List<Spot> spots) {}

    Content layer(String name) {
        return byName.computeIfAbsent(name, n -> new Content(new ArrayList<>(), new ArrayList<>()));
    }

    /** Layers with something on them, in the order in which they are first drawn on. */
    Map<String, Content> all() {
        return byName;
    }

    /** The box around everything. */
    Envelope box() {
        Envelope box = new Envelope();
        for (Content content : byName.values()) {
            content.strands().forEach(s -> box.expandToInclude(s.box()));
            content.spots().forEach(s -> box.expandToInclude(s.at()));
        }
        return box;
    }
}
