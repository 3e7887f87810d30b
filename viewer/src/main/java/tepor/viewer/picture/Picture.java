package tepor.viewer.picture;

import java.awt.Graphics2D;

/** A picture of known size that can be painted onto anything. Painting it twice gives the same. */
public interface Picture {
    /** Pixels. */
    int width();

    /** Pixels. */
    int height();

    /** What it shows, in one line of text, for those who cannot see it. */
    String description();

    /** Paints the whole picture, its white background included. */
    void paint(Graphics2D g);
}
