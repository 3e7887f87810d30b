package tepor.viewer.picture.drawing;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.image.BufferedImage;
import java.awt.image.DataBufferByte;
import java.util.Arrays;

/** Which parts of a picture are taken, in small square cells; so that text finds room. */
public final class OccupancyGrid {
    private static final int FREE = 0;
    private static final int TAKEN = -1;

    private final double cell;
    private final int columns;
    private final int rows;
    /** 0 free, −1 taken, else the owner + 1 whose lines alone run through the cell. */
    private final int[] state;

    /**
     * @param width of the picture
     * @param height of the picture
     * @param cell side of a cell
     */
    public OccupancyGrid(double width, double height, double cell) {
        this.cell = cell;
        columns = (int) Math.ceil(width / cell) + 1;
        rows = (int) Math.ceil(height / cell) + 1;
        state = new int[columns * rows];
    }

    private OccupancyGrid(OccupancyGrid other) {
        cell = other.cell;
        columns = other.columns;
        rows = other.rows;
        state = other.state.clone();
    }

    public OccupancyGrid copy() {
        return new OccupancyGrid(this);
    }

    /** Takes everything outside a shape. */
    public void takeOutside(Shape shape) {
        BufferedImage image = new BufferedImage(columns, rows, BufferedImage.TYPE_BYTE_GRAY);
        Graphics2D g = image.createGraphics();
        g.setColor(Color.WHITE);
        g.scale(1 / cell, 1 / cell);
        g.fill(shape);
        g.dispose();
        byte[] inside = ((DataBufferByte) image.getRaster().getDataBuffer()).getData();
        for (int i = 0; i < state.length; i++) {
            if (inside[i] == 0) {
                state[i] = TAKEN;
            }
        }
    }

    /** Takes a rectangle. */
    public void takeBox(double x0, double y0, double x1, double y1) {
        int c0 = Math.max(0, (int) Math.floor(x0 / cell));
        int c1 = Math.min(columns - 1, (int) Math.floor(x1 / cell));
        for (int r = Math.max(0, (int) Math.floor(y0 / cell));
                r <= Math.min(rows - 1, (int) Math.floor(y1 / cell));
                r++) {
            if (c0 <= c1) {
                Arrays.fill(state, r * columns + c0, r * columns + c1 + 1, TAKEN);
            }
        }
    }

    /** Takes the cells along a line for everyone. */
    public void takeLine(double x0, double y0, double x1, double y1) {
        mark(x0, y0, x1, y1, TAKEN);
    }

    /** Marks the cells along a line as an owner's: taken for all but this owner. */
    public void takeLine(double x0, double y0, double x1, double y1, int owner) {
        mark(x0, y0, x1, y1, owner + 1);
    }

    private void mark(double x0, double y0, double x1, double y1, int code) {
        int steps = 1 + (int) (Math.hypot(x1 - x0, y1 - y0) / (0.7 * cell));
        for (int i = 0; i <= steps; i++) {
            int index = index(x0 + (x1 - x0) * i / steps, y0 + (y1 - y0) * i / steps);
            if (index >= 0 && state[index] != code) {
                state[index] = state[index] == FREE ? code : TAKEN;
            }
        }
    }

    private int index(double x, double y) {
        int c = (int) Math.floor(x / cell);
        int r = (int) Math.floor(y / cell);
        return c < 0 || r < 0 || c >= columns || r >= rows ? -1 : r * columns + c;
    }

    /**
     * Whether a turned rectangle is free for an owner.
     *
     * @param x centre
     * @param y centre
     * @param halfWidth along its own direction
     * @param halfHeight across
     * @param angle of its direction, radians, clockwise on the page
     */
    public boolean isFree(double x, double y, double halfWidth, double halfHeight, double angle, int owner) {
        return visit(x, y, halfWidth, halfHeight, angle, owner + 1, false);
    }

    /** Whether a turned rectangle is free for anyone. */
    public boolean isFree(double x, double y, double halfWidth, double halfHeight, double angle) {
        return visit(x, y, halfWidth, halfHeight, angle, FREE, false);
    }

    /** Takes a turned rectangle. */
    public void take(double x, double y, double halfWidth, double halfHeight, double angle) {
        visit(x, y, halfWidth, halfHeight, angle, 0, true);
    }

    private boolean visit(
            double x, double y, double halfWidth, double halfHeight, double angle, int code, boolean taking) {
        double ux = Math.cos(angle);
        double uy = Math.sin(angle);
        int along = 1 + (int) (2 * halfWidth / (0.9 * cell));
        int across = 1 + (int) (2 * halfHeight / (0.9 * cell));
        for (int i = 0; i <= along; i++) {
            double s = halfWidth * (2.0 * i / along - 1);
            for (int j = 0; j <= across; j++) {
                double t = halfHeight * (2.0 * j / across - 1);
                int index = index(x + s * ux - t * uy, y + s * uy + t * ux);
                if (taking) {
                    if (index >= 0) {
                        state[index] = TAKEN;
                    }
                } else if (index < 0 || (state[index] != FREE && state[index] != code)) {
                    return false;
                }
            }
        }
        return true;
    }
}
