package tepor.viewer.picture;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import tepor.solver.answer.Answer;
import tepor.solver.field.TemperatureField;
import tepor.viewer.picture.LineLabels.Label;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.contour.Isotherm;
import tepor.viewer.picture.contour.Isotherms;
import tepor.viewer.picture.contour.TemperatureScale;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;

/** The field of an answer in one view: bands, isotherms with their figures, mesh and arrows, with outline and borders. */
final class FieldLayer {
    private final Answer answer;
    private final PictureOptions options;
    private final Isotherms isotherms;
    private final SectionView view;
    private final FluxArrows arrows;
    private final double unit;
    /** The isotherms' lines in pixels. */
    private final List<Isotherm> lines = new ArrayList<>();

    private final List<Label> labels;

    /**
     * @param view where the section stands
     * @param arrows along the flux; null for none
     * @param area in which figures may stand, px
     * @param taken what they must keep clear of: markers, other parts of the picture
     */
    FieldLayer(
            Answer answer,
            PictureOptions options,
            Isotherms isotherms,
            SectionView view,
            FluxArrows arrows,
            Rectangle2D area,
            OccupancyGrid taken) {
        this.answer = answer;
        this.options = options;
        this.isotherms = isotherms;
        this.view = view;
        this.arrows = arrows;
        unit = Sheet.unit(options);
        for (Isotherm line : isotherms.lines()) {
            lines.add(new Isotherm(line.level(), view.toPixels(line.xy()), line.closed()));
        }
        labels = options.has(Layer.LINES) ? placeLabels(area, taken) : List.of();
    }

    private List<Label> placeLabels(Rectangle2D area, OccupancyGrid grid) {
        grid.takeOutside(area);
        grid.takeOutside(view.material());
        for (Isotherm line : lines) {
            double[] xy = line.xy();
            for (int i = 0; i + 3 < xy.length; i += 2) {
                if (area.intersectsLine(xy[i], xy[i + 1], xy[i + 2], xy[i + 3])) {
                    grid.takeLine(xy[i], xy[i + 1], xy[i + 2], xy[i + 3], line.level());
                }
            }
        }
        view.takeBorders(grid);
        TemperatureScale scale = isotherms.scale();
        Font font = Sheet.font(options);
        return new LineLabels(font, grid, i -> FigureText.number(scale.celsius(i), scale.decimals())).place(lines);
    }

    void paint(Graphics2D g) {
        view.paintOutline(g);
        paintBands(g);
        if (options.has(Layer.MESH)) {
            paintMesh(g);
        }
        if (options.has(Layer.LINES)) {
            paintLines(g);
        }
        view.paintBorders(g);
        view.paintCuts(g);
        view.paintInsulated(g, answer.insulated().pieces());
        if (arrows != null) {
            arrows.paint(g, labels);
        }
    }

    /** Each warmer area is laid over the next colder one, so that no seam shows between bands. */
    private void paintBands(Graphics2D g) {
        int bands = isotherms.scale().bandCount();
        boolean filled = options.has(Layer.BANDS);
        Ink.fill(g, view.shape(isotherms.section()), filled ? ColourMap.ofBand(0, bands) : Ink.PAPER);
        for (int i = 0; filled && i < isotherms.areas().size(); i++) {
            Ink.fill(g, view.shape(isotherms.areas().get(i)), ColourMap.ofBand(i + 1, bands));
        }
    }

    /** In the ink that stands out from the bands. */
    private void paintMesh(Graphics2D g) {
        TemperatureScale scale = isotherms.scale();
        double switching = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < scale.count() && ink(i).equals(Ink.LIGHT); i++) {
            switching = scale.kelvin(i);
        }
        double from = switching;
        TemperatureField field = answer.field();
        view.paintMesh(g, field.mesh(), Ink.LIGHT, (a, b) -> field.at(a) + field.at(b) < 2 * from);
        view.paintMesh(g, field.mesh(), Ink.DARK, (a, b) -> field.at(a) + field.at(b) >= 2 * from);
    }

    private void paintLines(Graphics2D g) {
        Path2D[] paths = new Path2D[isotherms.scale().count()];
        for (int i = 0; i < paths.length; i++) {
            paths[i] = new Path2D.Double();
        }
        for (int i = 0; i < lines.size(); i++) {
            Isotherm line = lines.get(i);
            int iLine = i;
            List<Label> own = labels.stream().filter(l -> l.line() == iLine).toList();
            if (own.isEmpty()) {
                Ink.append(paths[line.level()], line.xy(), line.closed());
            } else {
                LineLabels.cut(line, own).forEach(part -> Ink.append(paths[line.level()], part, false));
            }
        }
        for (int i = 0; i < paths.length; i++) {
            Ink.draw(g, paths[i], ink(i), 1.5 * unit);
        }
        for (Label label : labels) {
            AffineTransform before = g.getTransform();
            g.rotate(label.angle(), label.x(), label.y());
            Ink.centred(g, label.text(), label.x(), label.y(), Sheet.font(options), ink(label.level()));
            g.setTransform(before);
        }
    }

    /** The ink that stands out from both bands beside an isotherm. */
    private Color ink(int isotherm) {
        if (!options.has(Layer.BANDS)) {
            return Ink.DARK;
        }
        int bands = isotherms.scale().bandCount();
        double l = 0.5
                * (ColourMap.lightness(ColourMap.ofBand(isotherm, bands))
                        + ColourMap.lightness(ColourMap.ofBand(isotherm + 1, bands)));
        return l < 52 ? Ink.LIGHT : Ink.DARK;
    }
}
