package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import tepor.viewer.picture.drawing.EntryList;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.PictureFont;

/**
 * How a picture's parts share its sheet: title on top, then the section with its key row beneath; the legend and the list
 * stand beside it, or lie below where the section is wide or the list long.
 */
final class Sheet {
    private static final double MARGIN = 46;
    private static final double GAP = 36;
    /** Around the section, for tags and ticks. */
    private static final double PAD = 46;

    private static final double LIST_COLUMN = 400;
    private static final double LONGEST_LIST = 800;
    private static final double TALLEST_VIEW = 1320;

    final double unit;
    final Font font;
    final int width;
    final int height;
    final boolean beside;
    /** In which the section is drawn. */
    final Rectangle2D view;
    /** In which tags may lie. */
    final Rectangle2D frame;

    final Rectangle2D legend;
    final double keysTop;
    final double listLeft;
    final double listTop;
    final double listWidth;
    final int listColumns;

    private final List<String> title;
    private final Font titleFont;

    /**
     * @param title above all
     * @param aspect the section's width over its height
     * @param legendUpright height of an upright legend; 0 for none
     * @param legendFlat height of a lying legend; 0 for none
     */
    Sheet(
            PictureOptions options,
            String title,
            double aspect,
            double legendUpright,
            double legendFlat,
            KeyRow keys,
            EntryList list) {
        width = options.width();
        unit = unit(options);
        font = font(options);
        titleFont = PictureFont.size(34 * unit);
        double margin = MARGIN * unit;
        double inner = width - 2 * margin;
        this.title = EntryList.wrap(title, titleFont, inner, 2);
        double top = margin + this.title.size() * 42 * unit + 14 * unit;

        double pad = PAD * unit;
        double narrow = TALLEST_VIEW * unit * aspect + 2 * pad + 2.5 * pad; // all that a tall section needs, with tags
        double side = Math.max(LIST_COLUMN * unit, Math.min(LONGEST_LIST * unit, inner - GAP * unit - narrow));
        double listBeside = list.height(side, 1);
        double sideHeight = legendUpright + (listBeside > 0 && legendUpright > 0 ? GAP * unit : 0) + listBeside;
        double viewBeside = inner - side - GAP * unit;
        double natural = Math.min((viewBeside - 2 * pad) / aspect, TALLEST_VIEW * unit) + 2 * pad;
        beside = aspect < 2.1 && sideHeight < Math.max(1.35 * natural, 640 * unit) && sideHeight > 0;
        double viewWidth = beside ? viewBeside : inner;
        double keysHeight = keys.height(viewWidth);

        listColumns = beside ? 1 : 3;
        listWidth = beside ? side : (inner - 2 * GAP * unit) / 3;
        double below = beside
                ? 0
                : (legendFlat > 0 ? legendFlat + GAP * unit : 0)
                        + (list.isEmpty() ? 0 : list.height(listWidth, listColumns) + GAP * unit);
        double wanted = Math.min((viewWidth - 2 * pad) / aspect, TALLEST_VIEW * unit) + 2 * pad;
        double around = top + keysHeight + below + margin;
        double viewHeight = options.height() == 0 ? wanted : Math.max(140 * unit, options.height() - around);
        double tallest = Math.max(around + viewHeight, beside ? top + sideHeight + margin : 0);
        height = options.height() == 0 ? (int) Math.ceil(tallest) : options.height();

        frame = new Rectangle2D.Double(margin, top, viewWidth, viewHeight);
        view = new Rectangle2D.Double(margin + pad, top + pad, viewWidth - 2 * pad, viewHeight - 2 * pad);
        keysTop = top + viewHeight;
        double belowTop = keysTop + keysHeight + GAP * unit;
        double sideLeft = margin + viewWidth + GAP * unit;
        if (beside) {
            legend = new Rectangle2D.Double(sideLeft, top, side, legendUpright);
            listLeft = sideLeft;
            listTop = top + (legendUpright > 0 ? legendUpright + GAP * unit : 0);
        } else {
            legend = new Rectangle2D.Double(margin, belowTop, inner, legendFlat);
            listLeft = margin;
            listTop = belowTop + (legendFlat > 0 ? legendFlat + GAP * unit : 0);
        }
    }

    /** Px for which sizes are meant: 1 where the picture is 1600 wide. */
    static double unit(PictureOptions options) {
        return options.width() / 1600.0;
    }

    /** The font of all but the title: 7 points where the picture is printed 180 mm wide. */
    static Font font(PictureOptions options) {
        return PictureFont.size(22.4 * unit(options));
    }

    void paintTitle(Graphics2D g) {
        for (int i = 0; i < title.size(); i++) {
            Ink.text(g, title.get(i), MARGIN * unit, (MARGIN + 26 + 42 * i) * unit, titleFont, Ink.DARK);
        }
    }

    void paintBelowTitle(Graphics2D g, KeyRow keys, EntryList list) {
        keys.paint(g, MARGIN * unit, keysTop, frame.getWidth());
        list.paint(g, listLeft, listTop, listWidth, GAP * unit, listColumns);
    }
}
