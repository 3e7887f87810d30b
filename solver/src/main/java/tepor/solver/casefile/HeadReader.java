package tepor.solver.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import tepor.solver.casefile.KeyTable.Keys;
import tepor.solver.casefile.KeyTable.Value;
import tepor.solver.casefile.QuantityKeys.Range;
import tepor.solver.model.Accuracy;
import tepor.solver.model.Input;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.QuantityException;
import tepor.solver.quantity.QuantityReader;

/** Reads what a case says of itself as a whole: format, title, symmetry, depth, {@code [report]}, {@code [accuracy]}. */
final class HeadReader {
    static final Keys CASE = Keys.of(
            "format",
            "title",
            "symmetry",
            "depth",
            "report",
            "outline",
            "region",
            "material",
            "air",
            "edge",
            "ask",
            "mesh",
            "accuracy");
    private static final Keys REPORT = Keys.of(
            "project", "document", "revision", "purpose", "drawing", "standard", "prepared", "checked", "approved");
    private static final Keys ACCURACY = Keys.of("adapt", "confidence");
    private static final double CONFIDENCE = 0.95;
    private static final String REMEDY = "write confidence = \"95 %\", or a number between 0 and 1";

    private HeadReader() {}

    /** Whether the case is of a format that can be read at all; one that states no format is read as format 1. */
    static boolean readFormat(KeyTable root) {
        if (!root.has("format")) {
            root.missing("format", "format = 1");
            return true;
        }
        Optional<Long> format = root.integer("format", "format = 1");
        if (format.isPresent() && format.get() != 1) {
            root.findings()
                    .error(
                            "format",
                            root.place("format"),
                            "the case is of format " + format.get() + ", and this version reads format 1",
                            "write format = 1, or take a version that reads format " + format.get());
            return false;
        }
        return true;
    }

    /** The title; the name of the case where it states none. */
    static String readTitle(KeyTable root, String caseName) {
        return root.text("title").filter(t -> !t.isBlank()).orElse(caseName);
    }

    static void checkSymmetry(KeyTable root) {
        root.text("symmetry").ifPresent(symmetry -> {
            if (symmetry.equals("axial")) {
                root.later(
                        root.place("symmetry"),
                        "symmetry = \"axial\"",
                        "only symmetry = \"planar\" is answered: a part that is the same along its length");
            } else if (!symmetry.equals("planar")) {
                root.findings()
                        .error(
                                "unknown-word",
                                root.place("symmetry"),
                                "symmetry is \"" + symmetry + "\"",
                                "write symmetry = \"planar\", or leave it out");
            }
        });
    }

    /** The depth; null where the case states none or a wrong one. */
    static Input readDepth(KeyTable root, QuantityKeys quantities) {
        return quantities
                .input(root, "depth", "depth", Range.POSITIVE, Dimension.LENGTH)
                .orElse(null);
    }

    /** The free text of the report, by key. */
    static Map<String, String> readReport(KeyTable root) {
        Map<String, String> fields = new LinkedHashMap<>();
        root.table("report").ifPresent(report -> {
            report.allow(REPORT);
            for (String key : report.keys()) {
                if (REPORT.now().contains(key)) {
                    report.text(key).ifPresent(text -> fields.put(key, text));
                }
            }
        });
        return fields;
    }

    static Accuracy readAccuracy(KeyTable root) {
        Optional<KeyTable> table = root.table("accuracy");
        table.ifPresent(t -> t.allow(ACCURACY));
        boolean adapt = table.flatMap(t -> t.flag("adapt")).orElse(true);
        double confidence = table.flatMap(t -> t.value("confidence"))
                .flatMap(HeadReader::confidence)
                .orElse(CONFIDENCE);
        return new Accuracy(adapt, confidence);
    }

    private static Optional<Double> confidence(Value value) {
        double fraction;
        if (value.raw() instanceof Number number) {
            fraction = number.doubleValue();
        } else {
            Optional<String> text = value.text();
            if (text.isEmpty()) {
                return Optional.empty();
            }
            try {
                fraction = QuantityReader.readFraction(text.get());
            } catch (QuantityException e) {
                value.findings().error("quantity", value.place(), value.name() + ": " + e.getMessage(), REMEDY);
                return Optional.empty();
            }
        }
        if (!(fraction > 0 && fraction < 1)) {
            boolean percentMeant = value.isNumber() && fraction > 1 && fraction < 100;
            value.findings()
                    .error(
                            "out-of-range",
                            value.place(),
                            value.name() + " is " + value.found() + ", but must lie between 0 and 1 (0 % and 100 %)",
                            percentMeant ? "write \"" + value.raw() + " %\" if percent are meant" : REMEDY);
            return Optional.empty();
        }
        return Optional.of(fraction);
    }
}
