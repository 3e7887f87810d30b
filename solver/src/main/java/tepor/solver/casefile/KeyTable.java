package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import org.tomlj.TomlArray;
import org.tomlj.TomlPosition;
import org.tomlj.TomlTable;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** A TOML table with the place of every key, which reports keys it does not know and values of the wrong type. */
final class KeyTable {
    private static final Pattern BARE = Pattern.compile("[A-Za-z0-9_-]+");

    /** Keys of the case itself, which TOML takes for keys of the table above them when they stand too late. */
    private static final Set<String> BEFORE_TABLES = Set.of("format", "title", "symmetry", "depth");

    private final TomlTable toml;
    private final String header;
    private final String label;
    private final Place place;
    private final Findings findings;

    /**
     * @param toml the table
     * @param header how the table is written, for messages: {@code [[region]]}
     * @param label what it states, for messages: {@code region 'bars'}
     * @param place where it begins
     * @param findings takes what is wrong
     */
    KeyTable(TomlTable toml, String header, String label, Place place, Findings findings) {
        this.toml = toml;
        this.header = header;
        this.label = label;
        this.place = place;
        this.findings = findings;
    }

    /**
     * The keys that a table may have.
     *
     * @param now those that are read
     * @param later those of the format which are refused for now, each with what to do instead
     */
    record Keys(Set<String> now, Map<String, String> later) {
        static Keys of(String... now) {
            return new Keys(new LinkedHashSet<>(List.of(now)), Map.of());
        }
    }

    /**
     * A value with its place.
     *
     * @param raw as the TOML library gives it
     * @param name how messages call it, such as {@code 'heat' of region 'bars'}
     * @param place of the key, or of the element in an array
     * @param findings takes what is wrong
     */
    record Value(Object raw, String name, Place place, Findings findings) {
        boolean isText() {
            return raw instanceof String;
        }

        boolean isTable() {
            return raw instanceof TomlTable;
        }

        boolean isArray() {
            return raw instanceof TomlArray;
        }

        /** Whether it is a number, whole or not. */
        boolean isNumber() {
            return raw instanceof Long || raw instanceof Double;
        }

        /** The text; an error where it is of another type. */
        Optional<String> text() {
            if (raw instanceof String text) {
                return Optional.of(text);
            }
            wrongType("text", "write it in double quotes");
            return Optional.empty();
        }

        /** The table; an error where it is of another type. */
        Optional<KeyTable> table(String header, String label) {
            if (raw instanceof TomlTable table) {
                return Optional.of(new KeyTable(table, header, label, place, findings));
            }
            wrongType("a table", "write " + header);
            return Optional.empty();
        }

        /** The elements; an error where it is of another type. */
        List<Value> elements(String example) {
            if (!(raw instanceof TomlArray array)) {
                wrongType("an array", "write " + example);
                return List.of();
            }
            List<Value> values = new ArrayList<>();
            for (int i = 0; i < array.size(); i++) {
                values.add(new Value(
                        array.get(i),
                        "element " + (i + 1) + " of " + name,
                        at(place.file(), array.inputPositionOf(i), place),
                        findings));
            }
            return values;
        }

        /** Reports that the value is of another type than the one wanted. */
        void wrongType(String wanted, String remedy) {
            findings.error("wrong-type", place, name + " is " + found() + ", where " + wanted + " is wanted", remedy);
        }

        /** What was found, for messages. */
        String found() {
            if (raw instanceof String text) {
                return "the text \"" + shortened(text) + "\"";
            }
            if (isNumber()) {
                return "the bare number " + raw;
            }
            if (raw instanceof Boolean) {
                return "the bare word " + raw;
            }
            return isTable() ? "a table" : isArray() ? "an array" : "a date or time";
        }

        private static String shortened(String text) {
            String line = text.replaceAll("\\s+", " ");
            return line.length() <= 60 ? line : line.substring(0, 57) + "…";
        }
    }

    Findings findings() {
        return findings;
    }

    /** Where the table begins. */
    Place place() {
        return place;
    }

    /** Where a key stands; where the table begins if it has no such key. */
    Place place(String key) {
        return at(place.file(), toml.inputPositionOf(List.of(key)), place);
    }

    String label() {
        return label;
    }

    /** The same table under another label. */
    KeyTable called(String newLabel) {
        return new KeyTable(toml, header, newLabel, place, findings);
    }

    /** The same table with other ears for what is wrong. */
    KeyTable reportingTo(Findings others) {
        return new KeyTable(toml, header, label, place, others);
    }

    Set<String> keys() {
        return toml.keySet();
    }

    boolean has(String key) {
        return toml.contains(List.of(key));
    }

    /** The value of a key, if it is there. */
    Optional<Value> value(String key) {
        Object raw = toml.get(List.of(key));
        return Optional.ofNullable(raw).map(r -> new Value(r, "'" + key + "' of " + label, place(key), findings));
    }

    /** Reports every key that is not among those allowed. */
    void allow(Keys allowed) {
        for (String key : keys()) {
            if (allowed.now().contains(key)) {
                continue;
            }
            if (allowed.later().containsKey(key)) {
                later(place(key), "'" + key + "' in " + header, allowed.later().get(key));
                continue;
            }
            List<String> known = new ArrayList<>(allowed.now());
            known.addAll(allowed.later().keySet());
            findings.error(
                    "unknown-key",
                    place(key),
                    "unknown key '" + key + "' in " + header,
                    BEFORE_TABLES.contains(key)
                            ? "'" + key + "' stands before the first table of the case"
                            : NearestWord.to(key, known)
                                    .map(near -> "did you mean '" + near + "'")
                                    .orElse("keys of " + header + " are " + NearestWord.list(allowed.now())));
        }
    }

    /** Reports something that the format has and this version does not. */
    void later(Place where, String what, String instead) {
        findings.error(
                "not-in-this-version",
                where,
                what + " belongs to format 1, but this version does not do it yet",
                instead);
    }

    /** The text of a key, if it is there; an error where it is of another type. */
    Optional<String> text(String key) {
        return value(key).flatMap(Value::text);
    }

    /** The text of a key that must be there. */
    Optional<String> requiredText(String key, String example) {
        if (!has(key)) {
            missing(key, example);
            return Optional.empty();
        }
        return text(key).filter(text -> {
            if (text.isBlank()) {
                findings.error("empty-text", place(key), "'" + key + "' of " + label + " is empty", "write " + example);
            }
            return !text.isBlank();
        });
    }

    /** Reports that a key is missing. */
    void missing(String key, String example) {
        findings.error("missing-key", place, label + " has no '" + key + "'", "write " + example);
    }

    /** The truth value of a key, if it is there; an error where it is of another type. */
    Optional<Boolean> flag(String key) {
        return value(key).flatMap(v -> {
            if (v.raw() instanceof Boolean flag) {
                return Optional.of(flag);
            }
            v.wrongType("true or false", "write " + key + " = true or " + key + " = false, without quotes");
            return Optional.empty();
        });
    }

    /** The whole number of a key, if it is there; an error where it is of another type. */
    Optional<Long> integer(String key, String example) {
        return value(key).flatMap(v -> {
            if (v.raw() instanceof Long number) {
                return Optional.of(number);
            }
            v.wrongType("a whole number", "write " + example);
            return Optional.empty();
        });
    }

    /** The table of a key, written {@code [key]}, if it is there; an error where it is of another type. */
    Optional<KeyTable> table(String key) {
        return value(key).flatMap(v -> v.table("[" + key + "]", "[" + key + "]"));
    }

    /** The tables under a key, written {@code [key.NAME]}, by name. */
    Map<String, KeyTable> namedTables(String key) {
        Map<String, KeyTable> tables = new LinkedHashMap<>();
        table(key).ifPresent(all -> {
            for (String name : all.keys()) {
                String subheader = "[" + key + "." + (isBare(name) ? name : "\"" + name + "\"") + "]";
                Value value = all.value(name).orElseThrow();
                if (value.isTable()) {
                    value.table(subheader, key + " '" + name + "'").ifPresent(t -> tables.put(name, t));
                } else {
                    findings.error(
                            "wrong-type",
                            value.place(),
                            "'" + name + "' in [" + key + "] is " + value.found() + ", where a table is wanted",
                            "every " + key + " has a name of its own: begin it with [" + key + ".NAME]");
                }
            }
        });
        return tables;
    }

    /** Whether TOML takes the name as a key without quotes. */
    static boolean isBare(String name) {
        return BARE.matcher(name).matches();
    }

    /** The tables of a key, written {@code [[key]]}; each labelled with its name, or else its number. */
    List<KeyTable> arrayTables(String key) {
        List<KeyTable> tables = new ArrayList<>();
        String arrayHeader = "[[" + key + "]]";
        value(key).ifPresent(v -> {
            if (v.isTable()) {
                v.wrongType("an array of tables", "write " + arrayHeader + " with double brackets");
                return;
            }
            int number = 0;
            for (Value element : v.elements(arrayHeader)) {
                number++;
                String fallback = "the " + key + " number " + number;
                element.table(arrayHeader, fallback).ifPresent(t -> tables.add(t.labelledByName(key)));
            }
        });
        return tables;
    }

    private KeyTable labelledByName(String kind) {
        return toml.get(List.of("name")) instanceof String name && !name.isBlank()
                ? called(kind + " '" + name + "'")
                : this;
    }

    private static Place at(String file, TomlPosition position, Place otherwise) {
        return position == null ? otherwise : new Place(file, position.line(), position.column());
    }
}
