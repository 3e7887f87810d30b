package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.OutlineElement;
import tepor.mesher.outline.OutlineElement.Kind;
import tepor.solver.casefile.DrawingReader.Drawing;

/** Keeps account of which records or layers of the drawing the case uses, and warns of the others. */
final class RecordUse {
    private static final int SHOWN = 12;

    private final Set<Used> used = new HashSet<>();
    private boolean certain = true;

    private record Used(Kind kind, String name) {}

    void use(Kind kind, String name) {
        used.add(new Used(kind, name));
    }

    /** Something in the case is so wrong that it may have meant any record. */
    void setUncertain() {
        certain = false;
    }

    void warnOfUnused(Drawing drawing, Findings findings) {
        if (!certain || drawing.outline().isEmpty()) {
            return;
        }
        List<OutlineElement> unused = drawing.outline().get().elements().stream()
                .filter(e -> !used.contains(new Used(e.kind(), e.name())))
                .toList();
        if (drawing.dxf() && !unused.isEmpty()) {
            warnOfLayers(unused, findings);
        } else {
            unused.forEach(e -> warnOfRecord(e, findings));
        }
    }

    private static void warnOfRecord(OutlineElement element, Findings findings) {
        findings.warning(
                "unused-record",
                element.place(),
                (element.name().isEmpty() ? "a record without a name" : "the record '" + element.name() + "'") + " ("
                        + switch (element.kind()) {
                            case REGION -> "a region's outline";
                            case LINE -> "a line";
                            case POINT -> "a point";
                        }
                        + ") is used by nothing",
                switch (element.kind()) {
                    case REGION -> "add a [[region]] of its name, or leave it out";
                    case LINE -> "add an [[edge]] with where = { layer = \"" + element.name() + "\" }, or leave it out";
                    case POINT -> "copy it into an [[ask]], or leave it out";
                });
    }

    /** A drawing has many layers that are not meant for this: one warning for all. */
    private static void warnOfLayers(List<OutlineElement> unused, Findings findings) {
        Map<String, Map<Kind, Integer>> counts = new LinkedHashMap<>();
        for (OutlineElement e : unused) {
            counts.computeIfAbsent(e.name(), n -> new EnumMap<>(Kind.class)).merge(e.kind(), 1, Integer::sum);
        }
        List<String> layers = new ArrayList<>();
        counts.forEach((name, count) -> {
            List<String> parts = new ArrayList<>();
            count.forEach((kind, n) -> parts.add(n + " " + word(kind) + (n == 1 ? "" : "s")));
            layers.add("'" + name + "' (" + String.join(", ", parts) + ")");
        });
        int more = layers.size() - SHOWN;
        findings.warning(
                "unused-layers",
                unused.get(0).place(),
                "nothing uses what is on these layers: "
                        + String.join(", ", layers.subList(0, Math.min(SHOWN, layers.size())))
                        + (more > 0 ? " and on " + more + " more" : ""),
                "a [[region]] has the name of the layer of its loops, and where = { layer = \"…\" } finds what lies under"
                        + " open lines");
    }

    private static String word(Kind kind) {
        return switch (kind) {
            case REGION -> "closed loop";
            case LINE -> "open line";
            case POINT -> "point";
        };
    }
}
