package tepor.mesher.outline;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** The kinds of geometry in well-known text. */
enum WktKind {
    POINT,
    MULTIPOINT,
    LINESTRING,
    MULTILINESTRING,
    POLYGON,
    MULTIPOLYGON,
    CIRCULARSTRING,
    COMPOUNDCURVE,
    CURVEPOLYGON,
    MULTICURVE,
    MULTISURFACE,
    /** Whatever is not read. */
    OTHER;

    static final String REMEDY = "write a geometry as in POLYGON ((0 0, 4 0, 4 3, 0 0))";

    private static final Set<String> OF_NO_USE = Set.of(
            "GEOMETRYCOLLECTION",
            "GEOMETRY",
            "LINEARRING",
            "TRIANGLE",
            "TIN",
            "POLYHEDRALSURFACE",
            "CURVE",
            "SURFACE",
            "CIRCLE");

    /** Which numbers a point has. */
    enum Dimension {
        XY(2),
        Z(3),
        M(3),
        ZM(4);

        private final int numbers;

        Dimension(int numbers) {
            this.numbers = numbers;
        }

        int numbers() {
            return numbers;
        }

        /** The dimension of a tag such as {@code Z}; empty where it is none. */
        static Optional<Dimension> of(String tag) {
            return Arrays.stream(values())
                    .filter(d -> d != XY && d.name().equalsIgnoreCase(tag))
                    .findFirst();
        }
    }

    /** What a word such as {@code POLYGON} or {@code PointZ} says. */
    record Tag(WktKind kind, Dimension dimension) {}

    /** Why a word names no kind that is read. */
    record Refusal(String code, String what, String remedy) {}

    /** What kind of element a geometry of this kind is; not for {@link #OTHER}. */
    OutlineElement.Kind element() {
        return switch (this) {
            case POINT, MULTIPOINT -> OutlineElement.Kind.POINT;
            case LINESTRING, MULTILINESTRING, CIRCULARSTRING, COMPOUNDCURVE, MULTICURVE -> OutlineElement.Kind.LINE;
            case POLYGON, MULTIPOLYGON, CURVEPOLYGON, MULTISURFACE -> OutlineElement.Kind.REGION;
            case OTHER -> throw new IllegalArgumentException("not read");
        };
    }

    static Tag tag(String word) {
        String upper = word.toUpperCase(Locale.ROOT);
        for (WktKind kind : values()) {
            if (kind != OTHER && upper.startsWith(kind.name())) {
                String rest = upper.substring(kind.name().length());
                if (rest.isEmpty()) {
                    return new Tag(kind, Dimension.XY);
                }
                Optional<Dimension> dimension = Dimension.of(rest);
                if (dimension.isPresent()) {
                    return new Tag(kind, dimension.get());
                }
            }
        }
        return new Tag(OTHER, Dimension.XY);
    }

    /** Whether a word names a kind of geometry, read or not. */
    static boolean isKind(String word) {
        String upper = word.toUpperCase(Locale.ROOT);
        return tag(word).kind() != OTHER || OF_NO_USE.contains(upper);
    }

    /** Why a word that names none of the kinds read is refused. */
    static Refusal refusal(String word) {
        String upper = word.toUpperCase(Locale.ROOT);
        String shown = WktScanner.quote(word);
        if (OF_NO_USE.contains(upper)) {
            return new Refusal(
                    "kind-not-read",
                    shown + " is a kind of geometry that is not read",
                    "use POLYGON, MULTIPOLYGON or CURVEPOLYGON for regions, LINESTRING, CIRCULARSTRING or COMPOUNDCURVE for"
                            + " lines, POINT for points");
        }
        if (upper.startsWith("SRID=")) {
            return new Refusal(
                    "kind-not-read",
                    shown + " is no kind of geometry",
                    "leave the coordinate system out: lengths only");
        }
        String remedy = Arrays.stream(values())
                .filter(k -> k != OTHER && EditDistance.between(upper, k.name()) <= 2)
                .findFirst()
                .map(k -> "write " + k.name())
                .orElse(
                        "use POLYGON, MULTIPOLYGON, CURVEPOLYGON, LINESTRING, CIRCULARSTRING, COMPOUNDCURVE or POINT; a name"
                                + " takes a colon behind it");
        return new Refusal("unknown-kind", shown + " is no kind of geometry", remedy);
    }
}
