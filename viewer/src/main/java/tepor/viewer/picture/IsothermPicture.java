package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Rectangle2D;
import java.util.List;
import tepor.mesher.section.Section;
import tepor.solver.answer.Answer;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.contour.IsothermTracer;
import tepor.viewer.picture.contour.Isotherms;
import tepor.viewer.picture.contour.TemperatureRange;
import tepor.viewer.picture.contour.TemperatureScale;
import tepor.viewer.picture.drawing.EntryList;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;
import tepor.viewer.wording.ShownAnswer;

/** The temperatures of an answered case: bands, labelled isotherms, the asks' places and values, legend and scale bar. */
public final class IsothermPicture implements Picture {
    private static final int BANDS_AT_MOST = 16;
    /** Isotherms are drawn this close to the traced ones, px. */
    private static final double TOLERANCE = 0.08;

    private final Answer answer;
    private final PictureOptions options;
    private final Font font;
    private final Sheet sheet;
    private final SectionView view;
    private final Legend legend;
    private final KeyRow keys;
    private final AskMarkers markers;
    private final EntryList list;
    private final FieldLayer whole;
    /** Null where none is needed. */
    private final CloseUp closeUp;
    /** The field in the close-up; null where there is none. */
    private final FieldLayer enlarged;

    /** Lays the picture out; {@link #paint} may then be called for each kind of file. */
    public IsothermPicture(Answer answer, PictureOptions options) {
        this.answer = answer;
        this.options = options;
        font = Sheet.font(options);
        double unit = Sheet.unit(options);
        Section section = answer.subject().section();
        TemperatureScale scale = TemperatureScale.of(TemperatureRange.of(answer.field()), BANDS_AT_MOST);
        legend = new Legend(scale, font);
        List<ShownAnswer> shown = options.has(Layer.ASKS)
                ? answer.asks().stream()
                        .map(ask -> ShownAnswer.of(ask, answer.subject()))
                        .toList()
                : List.of();
        markers = new AskMarkers(shown, font);
        list = markers.list();

        // The sheet must know how many rows of keys there are, the keys how large the section becomes: a first layout
        // with a scale bar of the usual length settles it.
        double[] box = section.bounds();
        double aspect = (box[2] - box[0]) / (box[3] - box[1]);
        Sheet draft = sheet(aspect, keys(new KeyRow(font), null, 1e3, unit));
        SectionView draftView = new SectionView(section, draft.view, unit);
        FluxArrows draftArrows = arrows(draftView, unit);
        keys = keys(new KeyRow(font), draftArrows, draftView.scale(), unit);
        sheet = sheet(aspect, keys);
        view = new SectionView(section, sheet.view, unit);
        FluxArrows arrows = draftArrows == null ? null : arrows(view, unit).atScaleOf(draftArrows);

        closeUp = CloseUp.of(view, markers.places(), unit);
        SectionView near = closeUp == null ? view : new SectionView(section, closeUp.window(), closeUp.frame(), unit);
        Isotherms isotherms = IsothermTracer.trace(answer.field(), scale, TOLERANCE / near.scale());
        markers.place(near, closeUp == null ? sheet.frame : closeUp.frame());
        OccupancyGrid taken = new OccupancyGrid(sheet.width, sheet.height, 4 * unit);
        if (closeUp == null) {
            markers.take(taken);
            enlarged = null;
        } else {
            OccupancyGrid within = taken.copy();
            markers.take(within);
            take(within, closeUp.words(font));
            enlarged = new FieldLayer(answer, options, isotherms, near, null, closeUp.frame(), within);
            take(taken, closeUp.frame());
            take(taken, closeUp.source(view));
        }
        whole = new FieldLayer(answer, options, isotherms, view, arrows, sheet.frame, taken);
    }

    private static void take(OccupancyGrid grid, Rectangle2D box) {
        grid.takeBox(box.getMinX(), box.getMinY(), box.getMaxX(), box.getMaxY());
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
            flux.addTo(row, font);
        }
        return row;
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
        whole.paint(g);
        if (closeUp != null) {
            closeUp.paintSource(g, view, sheet.unit);
            Shape before = g.getClip();
            g.clip(closeUp.frame());
            Ink.fill(g, closeUp.frame(), Ink.PAPER);
            enlarged.paint(g);
            g.setClip(before);
            closeUp.paintFrame(g, view, font, sheet.unit);
        }
        markers.paint(g);
        if (sheet.beside) {
            legend.paintUpright(g, sheet.legend.getX(), sheet.legend.getY(), sheet.legend.getHeight());
        } else {
            legend.paintFlat(g, sheet.legend.getX(), sheet.legend.getY(), sheet.legend.getWidth());
        }
        sheet.paintBelowTitle(g, keys, list);
    }
}
