package tepor.viewer.picture;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.List;
import tepor.solver.answer.Answer;
import tepor.solver.field.TemperatureField;
import tepor.viewer.picture.LineLabels.Label;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.contour.Isotherm;
import tepor.viewer.picture.contour.IsothermTracer;
import tepor.viewer.picture.contour.Isotherms;
import tepor.viewer.picture.contour.TemperatureRange;
import tepor.viewer.picture.contour.TemperatureScale;
import tepor.viewer.picture.drawing.EntryList;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;

/** The temperatures of an answered case: bands, labelled isotherms, the asks' places and values, legend and scale bar. */
public final class IsothermPicture implements Picture {
    private static final int BANDS_AT_MOST = 16;
    /** Isotherms are drawn this close to the traced ones, px. */
    private static final double TOLERANCE = 0.08;

    private final Answer answer;
    private final PictureOptions options;
    private final Sheet sheet;
    private final SectionView view;
    private final Isotherms isotherms;
    private final Legend legend;
    private final KeyRow keys;
    private final AskMarkers markers;
    private final EntryList list;
    private final FluxArrows arrows;
    /** The isotherms' lines in pixels. */
    private final List<Isotherm> lines = new ArrayList<>();

    private final List<Label> labels;

    /** Lays the picture out; {@link #paint} may then be called for each kind of file. */
    public IsothermPicture(Answer answer, PictureOptions options) {
        this.answer = answer;
        this.options = options;
        Font font = Sheet.font(options);
        double unit = Sheet.unit(options);
        TemperatureScale scale = TemperatureScale.of(TemperatureRange.of(answer.field()), BANDS_AT_MOST);
        legend = new Legend(scale, font);
        markers = new AskMarkers(options.has(Layer.ASKS) ? answer.asks() : List.of(), font);
        list = markers.list();

        // The sheet needs to know how many rows of keys there are, the keys what the sheet leaves for the section; a
        // first
        // round with a scale bar of the usual length settles it.
        double[] box = answer.subject().section().bounds();
        double aspect = (box[2] - box[0]) / (box[3] - box[1]);
        Sheet draft = sheet(aspect, keys(new KeyRow(font), null, 1e3, unit));
        SectionView draftView = new SectionView(answer.subject().section(), draft.view, unit);
        FluxArrows draftArrows = arrows(draftView, unit);
        keys = keys(new KeyRow(font), draftArrows, draftView.scale(), unit);
        sheet = sheet(aspect, keys);
        view = new SectionView(answer.subject().section(), sheet.view, unit);
        arrows = draftArrows == null ? null : arrows(view, unit).atScaleOf(draftArrows);

        isotherms = IsothermTracer.trace(answer.field(), scale, TOLERANCE / view.scale());
        for (Isotherm line : isotherms.lines()) {
            lines.add(new Isotherm(line.level(), view.toPixels(line.xy()), line.closed()));
        }
        markers.place(view, sheet.frame);
        labels = options.has(Layer.LINES) ? placeLabels(scale, font, unit) : List.of();
    }

    private FluxArrows arrows(SectionView in, double unit) {
        return options.has(Layer.FLUX) ? new FluxArrows(answer.field(), answer.subject(), in, 50 * unit) : null;
    }

    private Sheet sheet(double aspect, KeyRow row) {
        return new Sheet(
                options, answer.subject().title(), aspect, legend.uprightHeight(), legend.flatHeight(), row, list);
    }

    private KeyRow keys(KeyRow row, FluxArrows flux, double pixelsPerMetre, double unit) {
        row.addScaleBar(pixelsPerMetre, 260 * unit, answer.subject().unit());
        if (answer.insulated().byDefault() > 0) {
            row.addInsulated(answer.insulated().byDefault(), answer.subject().unit());
        }
        if (flux != null) {
            flux.addTo(row, Sheet.font(options));
        }
        return row;
    }

    private List<Label> placeLabels(TemperatureScale scale, Font font, double unit) {
        OccupancyGrid grid = new OccupancyGrid(sheet.width, sheet.height, 4 * unit);
        grid.takeOutside(view.material());
        markers.take(grid);
        for (Isotherm line : lines) {
            double[] xy = line.xy();
            for (int i = 0; i + 3 < xy.length; i += 2) {
                grid.takeLine(xy[i], xy[i + 1], xy[i + 2], xy[i + 3], line.level());
            }
        }
        view.takeBorders(grid);
        return new LineLabels(font, grid, i -> FigureText.number(scale.celsius(i), scale.decimals())).place(lines);
    }

    @Override
    public int width() {
        return sheet.width;
    }

    @Override
    public int height() {
        return sheet.height;
    }

    @Override
    public String description() {
        return answer.subject().title() + ": " + Legend.heading() + ", " + legend.remark();
    }

    @Override
    public void paint(Graphics2D g) {
        Ink.prepare(g, sheet.width, sheet.height);
        sheet.paintTitle(g);
        view.paintOutline(g);
        paintBands(g);
        if (options.has(Layer.MESH)) {
            paintMesh(g);
        }
        if (options.has(Layer.LINES)) {
            paintLines(g);
        }
        view.paintBorders(g);
        view.paintInsulated(g, answer.insulated().pieces());
        if (arrows != null) {
            arrows.paint(g, labels);
        }
        markers.paint(g);
        if (sheet.beside) {
            legend.paintUpright(g, sheet.legend.getX(), sheet.legend.getY(), sheet.legend.getHeight());
        } else {
            legend.paintFlat(g, sheet.legend.getX(), sheet.legend.getY(), sheet.legend.getWidth());
        }
        sheet.paintBelowTitle(g, keys, list);
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
        double unit = sheet.unit;
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
