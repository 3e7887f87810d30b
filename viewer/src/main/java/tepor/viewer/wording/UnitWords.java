package tepor.viewer.wording;

/** Units and signs as they are printed, rather than as they are typed. */
public final class UnitWords {
    private UnitWords() {}

    /** A unit with a space before it: {@code W/(m2.K)} becomes " W/(m²·K)"; empty for a pure number. */
    public static String after(String unit) {
        return unit.isEmpty() ? "" : "\u00a0" + pretty(unit);
    }

    /** A unit, or a quantity with its unit, as it is printed. */
    public static String pretty(String text) {
        return text.replace("degC", "°C")
                .replace("degF", "°F")
                .replaceAll("(?<=[A-Za-z0-9)])\\.(?=[A-Za-z(])", "·")
                .replaceAll("\\bm\\^?2\\b", "m²")
                .replaceAll("\\bm\\^?3\\b", "m³")
                .replace("<=", "≤")
                .replace(">=", "≥");
    }
}
