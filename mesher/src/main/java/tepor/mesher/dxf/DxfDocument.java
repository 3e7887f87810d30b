package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** What a DXF file holds, as far as outlines need it. */
final class DxfDocument {
    private final Map<String, DxfRecord.Group> header = new HashMap<>();
    private final Map<String, Layer> layers = new HashMap<>();
    private final Map<String, Block> blocks = new LinkedHashMap<>();
    private final List<DxfRecord> entities = new ArrayList<>();

    /**
     * A layer.
     *
     * @param name as its table, or else its first entity, spells it
     */
    record Layer(String name, boolean frozen, boolean off) {}

    /** A block: its head and what is drawn in it. */
    record Block(String name, DxfRecord head, List<DxfRecord> entities) {}

    /** A variable of the header. */
    Optional<DxfRecord.Group> variable(String name) {
        return Optional.ofNullable(header.get(name));
    }

    void setVariable(String name, DxfRecord.Group value) {
        header.putIfAbsent(name, value);
    }

    /** The layer of a name; upper and lower case are the same. One that no table lists is on. */
    Layer layer(String name) {
        return layers.computeIfAbsent(name.toLowerCase(Locale.ROOT), n -> new Layer(name, false, false));
    }

    void addLayer(Layer layer) {
        layers.put(layer.name().toLowerCase(Locale.ROOT), layer);
    }

    /** The block of a name; upper and lower case are the same. */
    Optional<Block> block(String name) {
        return Optional.ofNullable(blocks.get(name.toLowerCase(Locale.ROOT)));
    }

    void addBlock(Block block) {
        blocks.put(block.name().toLowerCase(Locale.ROOT), block);
    }

    /** What is drawn outside of blocks. */
    List<DxfRecord> entities() {
        return entities;
    }
}
