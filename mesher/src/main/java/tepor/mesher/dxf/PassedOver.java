package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Counts what of a drawing is passed over, by kind and layer, and what of it is not read in full. */
final class PassedOver {
    private static final int SHOWN = 24;

    /** Why something is passed over. */
    enum Reason {
        KIND("kinds that draw no outline"),
        HIDDEN("on layers that are off or frozen"),
        INVISIBLE("marked as invisible"),
        PAPER("in paper space"),
        ASLANT("drawn in a plane that is not that of the drawing"),
        NET("meshes of faces"),
        FIT_POINTS("given by fit points only, without control points"),
        EXTERNAL("references to other files"),
        NO_LENGTH("without length");

        private final String words;

        Reason(String words) {
            this.words = words;
        }
    }

    private record Kind(Reason reason, String type, String layer) {}

    private final Map<Kind, Integer> counts = new LinkedHashMap<>();
    private int firstLine;
    private int total;
    private int heights;
    private int firstHeight;
    private int widths;
    private int firstWidth;

    void add(Reason reason, DxfRecord record, String layer) {
        counts.merge(new Kind(reason, record.type(), layer), 1, Integer::sum);
        firstLine = firstLine == 0 ? record.line() : Math.min(firstLine, record.line());
        total++;
    }

    /** An entity that lies above or below the plane. */
    void addHeight(DxfRecord record) {
        heights++;
        firstHeight = firstHeight == 0 ? record.line() : firstHeight;
    }

    /** A polyline that is drawn with a width. */
    void addWidth(DxfRecord record) {
        widths++;
        firstWidth = firstWidth == 0 ? record.line() : firstWidth;
    }

    void report(DxfFaults faults) {
        if (total > 0) {
            List<String> parts = new ArrayList<>();
            int shown = 0;
            for (Reason reason : Reason.values()) {
                List<String> ofReason = new ArrayList<>();
                for (Map.Entry<Kind, Integer> entry : counts.entrySet()) {
                    if (entry.getKey().reason() == reason && shown < SHOWN) {
                        ofReason.add(entry.getValue() + " " + entry.getKey().type() + " on layer "
                                + DxfFaults.quote(entry.getKey().layer()));
                        shown++;
                    }
                }
                if (!ofReason.isEmpty()) {
                    parts.add(String.join(", ", ofReason) + " (" + reason.words + ")");
                }
            }
            int more = counts.size() - shown;
            faults.warning(
                    "passed-over",
                    firstLine,
                    total + (total == 1 ? " entity is" : " entities are") + " passed over: " + String.join("; ", parts)
                            + (more > 0 ? "; and more of " + more + " kinds and layers" : ""),
                    "");
        }
        if (heights > 0) {
            faults.warning(
                    "heights",
                    firstHeight,
                    heights + (heights == 1 ? " entity lies" : " entities lie")
                            + " at a height other than 0, or rises; only x and y are read",
                    "");
        }
        if (widths > 0) {
            faults.warning(
                    "polyline-width",
                    firstWidth,
                    widths + (widths == 1 ? " polyline is" : " polylines are")
                            + " drawn with a width; the middle line is read",
                    "draw the outline itself where the width is meant");
        }
    }
}
