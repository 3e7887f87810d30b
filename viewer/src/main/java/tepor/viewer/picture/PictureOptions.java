package tepor.viewer.picture;

import java.util.EnumSet;
import java.util.Set;

/**
 * What a picture shows, and its size.
 *
 * @param width pixels; text scales with it, and is 7 points high where the picture is printed 180 mm wide
 * @param height pixels; 0 for what the section's shape and the lists need
 * @param layers what is drawn
 */
public record PictureOptions(int width, int height, Set<Layer> layers) {
    /** What may be drawn; the outline, the borders of regions and the legend always are. */
    public enum Layer {
        /** Filled areas between isotherms. */
        BANDS,
        /** Isotherms with their temperatures. */
        LINES,
        /** Sides of the mesh's triangles. */
        MESH,
        /** Arrows along the heat flux. */
        FLUX,
        /** Where asks have their places, and a list of all asks with their values. */
        ASKS
    }

    public PictureOptions {
        if (width < 400 || (height != 0 && height < 300)) {
            throw new IllegalArgumentException(width + " by " + height + " pixels are too few for a picture");
        }
        layers = Set.copyOf(layers);
    }

    /** Bands, lines and asks, 1600 pixels wide. */
    public static PictureOptions standard() {
        return new PictureOptions(1600, 0, EnumSet.of(Layer.BANDS, Layer.LINES, Layer.ASKS));
    }

    /** The same with one more layer. */
    public PictureOptions with(Layer layer) {
        EnumSet<Layer> more = EnumSet.of(layer);
        more.addAll(layers);
        return new PictureOptions(width, height, more);
    }

    public boolean has(Layer layer) {
        return layers.contains(layer);
    }
}
