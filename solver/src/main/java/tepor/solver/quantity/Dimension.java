package tepor.solver.quantity;

/** What a quantity measures: its physical dimension, and how the trade writes it. */
public enum Dimension {
    /** A temperature on a scale: kelvin inside, degC, degF or K outside. */
    TEMPERATURE("a temperature", "degC"),
    /** A temperature difference or tolerance, in K. */
    TEMPERATURE_DIFFERENCE("a temperature difference", "K"),
    LENGTH("a length", "m"),
    AREA("an area", "m2"),
    ANGLE("an angle", "deg"),
    CONDUCTIVITY("a conductivity", "W/(m.K)"),
    FILM("a film coefficient", "W/(m2.K)"),
    RESISTANCE("a surface or contact resistance", "m2.K/W"),
    HEAT("a heat flow", "W"),
    HEAT_PER_LENGTH("a heat flow per metre of depth", "W/m"),
    HEAT_PER_AREA("a heat flux", "W/m2"),
    HEAT_PER_VOLUME("a heat source density", "W/m3"),
    COUPLING("a thermal coupling coefficient or linear thermal transmittance", "W/(m.K)"),
    DENSITY("a density", "kg/m3"),
    HEAT_CAPACITY("a specific heat capacity", "J/(kg.K)"),
    PER_KELVIN("a temperature coefficient", "1/K"),
    NUMBER("a pure number", "");

    private final String words;
    private final String unit;

    Dimension(String words, String unit) {
        this.words = words;
        this.unit = unit;
    }

    /** With its article, for messages: "a conductivity". */
    public String words() {
        return words;
    }

    /** The unit in which answers and messages give it when nobody asked for another. */
    public String unit() {
        return unit;
    }
}
