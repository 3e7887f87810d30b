package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import tepor.mesher.dxf.DxfFaults.Fault;
import tepor.mesher.outline.DrawingUnit;

/** A record of a DXF file: what stands between one group 0 and the next, in whatever order. */
final class DxfRecord {
    /** Larger coordinates (metres) would overflow when they are multiplied. */
    private static final double LARGEST = 1e100;

    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eEdD][+-]?\\d+)?");

    private final String type;
    private final int line;
    private final List<Group> groups = new ArrayList<>();
    private final List<DxfRecord> children = new ArrayList<>();

    /** A pair of code and value, and the line of the value. */
    record Group(int code, String value, int line) {}

    DxfRecord(String type, int line) {
        this.type = type;
        this.line = line;
    }

    String type() {
        return type;
    }

    /** Line of the name of the record. */
    int line() {
        return line;
    }

    void add(int code, String value, int valueLine) {
        groups.add(new Group(code, value, valueLine));
    }

    List<Group> groups() {
        return groups;
    }

    /** Records that belong to this one: the vertices of a polyline, the attributes of an insert. */
    List<DxfRecord> children() {
        return children;
    }

    Optional<Group> group(int code) {
        return groups.stream().filter(g -> g.code() == code).findFirst();
    }

    boolean has(int code) {
        return group(code).isPresent();
    }

    String text(int code, String otherwise) {
        return group(code).map(Group::value).orElse(otherwise);
    }

    /** A number without a unit; the default where it is not given. */
    double number(int code, double otherwise) throws Fault {
        Optional<Group> group = group(code);
        return group.isPresent() ? number(group.get(), type) : otherwise;
    }

    /** A number without a unit that must be there. */
    double required(int code, String what) throws Fault {
        return number(need(code, what), type);
    }

    /** A length or coordinate, metres; the default where it is not given. */
    double length(int code, double otherwise, DrawingUnit unit) throws Fault {
        Optional<Group> group = group(code);
        return group.isPresent() ? length(group.get(), type, unit) : otherwise;
    }

    /** A length or coordinate that must be there, metres. */
    double requiredLength(int code, String what, DrawingUnit unit) throws Fault {
        return length(need(code, what), type, unit);
    }

    int integer(int code, int otherwise) throws Fault {
        Optional<Group> group = group(code);
        if (group.isEmpty()) {
            return otherwise;
        }
        double number = number(group.get(), type);
        if (number != Math.rint(number) || Math.abs(number) > Integer.MAX_VALUE) {
            throw fault("no-number", group.get(), DxfFaults.quote(group.get().value()) + " is no whole number");
        }
        return (int) number;
    }

    private Group need(int code, String what) throws Fault {
        Optional<Group> group = group(code);
        if (group.isEmpty()) {
            throw new Fault(
                    "group-missing",
                    line,
                    "this " + type + " has no " + what + " (group " + code + ")",
                    "draw it again, or delete it");
        }
        return group.get();
    }

    /** All numbers of one code, metres, in their order. */
    List<Double> lengths(int code, DrawingUnit unit) throws Fault {
        List<Double> numbers = new ArrayList<>();
        for (Group group : groups) {
            if (group.code() == code) {
                numbers.add(length(group, type, unit));
            }
        }
        return numbers;
    }

    /** All numbers of one code, in their order. */
    List<Double> numbers(int code) throws Fault {
        List<Double> numbers = new ArrayList<>();
        for (Group group : groups) {
            if (group.code() == code) {
                numbers.add(number(group, type));
            }
        }
        return numbers;
    }

    static double length(Group group, String type, DrawingUnit unit) throws Fault {
        double metres = unit.toMetres(number(group, type));
        if (!(Math.abs(metres) <= LARGEST)) {
            throw new Fault(
                    "number-too-large",
                    group.line(),
                    DxfFaults.quote(group.value()) + " is too large for a coordinate of a " + type,
                    "draw it where it belongs, or delete it");
        }
        return metres + 0.0; // no negative zero
    }

    static double number(Group group, String type) throws Fault {
        String text = group.value();
        if (!NUMBER.matcher(text).matches()) {
            String what = DxfFaults.quote(text) + " is no number (group " + group.code() + " of a " + type + ")";
            throw text.matches("[+-]?\\d+,\\d+")
                    ? new Fault("no-number", group.line(), what, "decimals take a point, not a comma")
                    : fault("no-number", group, what);
        }
        double number = Double.parseDouble(text.replace('d', 'e').replace('D', 'e'));
        if (!Double.isFinite(number)) {
            throw fault("number-too-large", group, DxfFaults.quote(text) + " is too large");
        }
        return number;
    }

    private static Fault fault(String code, Group group, String what) {
        return new Fault(code, group.line(), what, "write a finite number, as 12 or -3.5; or draw the entity again");
    }
}
