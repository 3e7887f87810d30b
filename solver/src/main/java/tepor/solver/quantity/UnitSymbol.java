package tepor.solver.quantity;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Stream;
import javax.measure.Unit;
import tech.units.indriya.AbstractUnit;
import tepor.mesher.outline.EditDistance;

/**
 * The unit symbols that are known, with SI prefixes where they take them.
 *
 * <p>Units are built from the SI base units through JSR 385; a format that parses whole unit texts is not used, because
 * loading one costs more than twice as much as all that is done here. Factors of inch, foot, pound, Btu (International
 * Table) and the degree Fahrenheit: NIST Special Publication 811 (2008), appendix B.8.
 *
 * @param name its one spelling, such as {@code mm} or {@code degC}
 * @param unit as a factor of a product: a degree is a difference here
 * @param zero how many of it lie between absolute zero and the zero of its scale, for degC and degF; 0 for all others
 * @param angle whether it is an angle, which JSR 385 takes for a pure number
 */
record UnitSymbol(String name, Unit<?> unit, double zero, boolean angle) {
    private static final Map<String, Integer> PREFIXES =
            Map.of("G", 9, "M", 6, "k", 3, "h", 2, "da", 1, "d", -1, "c", -2, "m", -3, "u", -6, "n", -9);

    /** Those that stand for themselves, and those that take prefixes, as they are asked for. */
    private static final Map<String, UnitSymbol> KNOWN = new ConcurrentHashMap<>();

    private static final Map<String, Unit<?>> WITH_PREFIXES = new HashMap<>();
    private static final Map<String, String> OTHER_SPELLINGS =
            Map.of("°C", "degC", "°F", "degF", "°", "deg", "Ω", "ohm");
    private static final Map<String, String> SLIPS = Map.ofEntries(
            Map.entry("c", "degC"),
            Map.entry("celsius", "degC"),
            Map.entry("centigrade", "degC"),
            Map.entry("f", "degF"),
            Map.entry("fahrenheit", "degF"),
            Map.entry("degk", "K"),
            Map.entry("°k", "K"),
            Map.entry("kelvin", "K"),
            Map.entry("hr", "h"),
            Map.entry("hour", "h"),
            Map.entry("hours", "h"),
            Map.entry("sec", "s"),
            Map.entry("second", "s"),
            Map.entry("inch", "in"),
            Map.entry("inches", "in"),
            Map.entry("feet", "ft"),
            Map.entry("foot", "ft"),
            Map.entry("lbs", "lb"),
            Map.entry("watt", "W"),
            Map.entry("watts", "W"),
            Map.entry("joule", "J"),
            Map.entry("meter", "m"),
            Map.entry("metre", "m"),
            Map.entry("micron", "um"),
            Map.entry("degree", "deg"),
            Map.entry("degrees", "deg"),
            Map.entry("radian", "rad"));

    static {
        Unit<?> metre = tech.units.indriya.unit.Units.METRE;
        Unit<?> kilogram = tech.units.indriya.unit.Units.KILOGRAM;
        Unit<?> second = tech.units.indriya.unit.Units.SECOND;
        Unit<?> kelvin = tech.units.indriya.unit.Units.KELVIN;
        Unit<?> ampere = tech.units.indriya.unit.Units.AMPERE;
        Unit<?> radian = tech.units.indriya.unit.Units.RADIAN;
        Unit<?> joule = tech.units.indriya.unit.Units.JOULE;

        withPrefixes("m", metre);
        withPrefixes("g", kilogram.divide(1000));
        withPrefixes("s", second);
        withPrefixes("K", kelvin);
        withPrefixes("A", ampere);
        withPrefixes("N", tech.units.indriya.unit.Units.NEWTON);
        withPrefixes("Pa", tech.units.indriya.unit.Units.PASCAL);
        withPrefixes("J", joule);
        withPrefixes("W", tech.units.indriya.unit.Units.WATT);
        withPrefixes("V", tech.units.indriya.unit.Units.VOLT);
        withPrefixes("ohm", tech.units.indriya.unit.Units.OHM);
        withPrefixes("L", metre.pow(3).divide(1000));

        // Without prefixes, and after them: "min" is a minute, not a thousandth of an inch.
        plain("h", second.multiply(3600));
        plain("min", second.multiply(60));
        plain("in", metre.multiply(0.0254));
        plain("ft", metre.multiply(0.3048));
        plain("lb", kilogram.multiply(0.45359237));
        plain("Btu", joule.multiply(1055.05585262));
        Unit<?> fahrenheit = kelvin.multiply(5).divide(9);
        KNOWN.put("degC", new UnitSymbol("degC", kelvin, 273.15, false));
        KNOWN.put("degF", new UnitSymbol("degF", fahrenheit, 459.67, false));
        KNOWN.put("rad", new UnitSymbol("rad", radian, 0, true));
        KNOWN.put("mrad", new UnitSymbol("mrad", radian.divide(1000), 0, true));
        KNOWN.put("deg", new UnitSymbol("deg", radian.multiply(Math.PI).divide(180), 0, true));
        KNOWN.put("%", new UnitSymbol("%", AbstractUnit.ONE.divide(100), 0, false));
    }

    private static void plain(String name, Unit<?> unit) {
        KNOWN.put(name, new UnitSymbol(name, unit, 0, false));
    }

    private static void withPrefixes(String name, Unit<?> unit) {
        plain(name, unit);
        WITH_PREFIXES.put(name, unit);
    }

    /** The symbol of this spelling; null where it is not known. */
    static UnitSymbol find(String spelling) {
        String name = OTHER_SPELLINGS.getOrDefault(spelling, spelling);
        if (name.length() > 1 && (name.charAt(0) == 'µ' || name.charAt(0) == 'μ')) {
            name = "u" + name.substring(1);
        }
        UnitSymbol known = KNOWN.get(name);
        return known != null || name.length() < 2 ? known : withPrefix(name);
    }

    private static UnitSymbol withPrefix(String name) {
        for (int length = 1; length <= 2 && length < name.length(); length++) {
            Integer power = PREFIXES.get(name.substring(0, length));
            Unit<?> unit = WITH_PREFIXES.get(name.substring(length));
            if (power != null && unit != null) {
                int factor = (int) Math.pow(10, Math.abs(power));
                plain(name, power > 0 ? unit.multiply(factor) : unit.divide(factor));
                return KNOWN.get(name);
            }
        }
        return null;
    }

    /** What may have been meant by an unknown spelling, as text that would be read; null where nothing comes near. */
    static String meant(String spelling) {
        String slip = SLIPS.get(spelling.toLowerCase(Locale.ROOT));
        if (slip != null) {
            return slip;
        }
        for (int i = 1; i < spelling.length(); i++) {
            UnitSymbol first = find(spelling.substring(0, i));
            UnitSymbol second = find(spelling.substring(i));
            if (first != null && second != null) {
                return first.name() + "." + second.name();
            }
        }
        String nearest = null;
        int least = spelling.length() > 3 ? 3 : 2;
        for (String name : shortestFirst()) {
            int distance = name.equalsIgnoreCase(spelling) ? 0 : EditDistance.between(name, spelling);
            if (distance < least && distance < spelling.length()) {
                nearest = name;
                least = distance;
            }
        }
        return nearest;
    }

    private static List<String> shortestFirst() {
        Stream<String> prefixed = PREFIXES.keySet().stream()
                .flatMap(prefix -> WITH_PREFIXES.keySet().stream().map(name -> prefix + name));
        return Stream.concat(KNOWN.keySet().stream(), prefixed)
                .distinct()
                .sorted(Comparator.comparingInt(String::length).thenComparing(Comparator.naturalOrder()))
                .toList();
    }
}
