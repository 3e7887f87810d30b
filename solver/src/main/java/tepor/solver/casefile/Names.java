package tepor.solver.casefile;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** The one name space of regions, edges and airs. */
final class Names {
    /** What a name stands for. */
    enum Kind {
        REGION("region", "a region"),
        EDGE("edge", "an edge"),
        AIR("air", "an air");

        private final String word;
        private final String words;

        Kind(String word, String words) {
            this.word = word;
            this.words = words;
        }

        String word() {
            return word;
        }

        String words() {
            return words;
        }
    }

    /** The first thing of a name, and what other kinds of thing wrongly share it. */
    private record Entry(Kind kind, Place place, Set<Kind> all) {}

    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final Findings findings;

    private Names(Findings findings) {
        this.findings = findings;
    }

    /** Collects the names of a case; a name that stands twice is an error at its second place. */
    static Names of(KeyTable root) {
        record Declared(String name, Kind kind, Place place) {}
        List<Declared> declared = new ArrayList<>();
        for (Kind kind : List.of(Kind.REGION, Kind.EDGE)) {
            // Wrong types are reported where the tables are read; here they are passed over.
            KeyTable silent = root.reportingTo(new Findings());
            for (KeyTable table : silent.arrayTables(kind.word())) {
                table.text("name")
                        .filter(n -> !n.isBlank())
                        .ifPresent(n -> declared.add(new Declared(n, kind, table.place("name"))));
            }
        }
        root.reportingTo(new Findings())
                .namedTables("air")
                .forEach((name, table) -> declared.add(new Declared(name, Kind.AIR, table.place())));
        declared.sort(Comparator.comparingInt((Declared d) -> d.place().line())
                .thenComparingInt(d -> d.place().column()));
        Names names = new Names(root.findings());
        for (Declared d : declared) {
            names.declare(d.name(), d.kind(), d.place());
        }
        return names;
    }

    private void declare(String name, Kind kind, Place place) {
        Entry first = entries.putIfAbsent(name, new Entry(kind, place, EnumSet.of(kind)));
        if (first != null) {
            first.all().add(kind);
            findings.error(
                    "duplicate-name",
                    place,
                    "the name '" + name + "' is taken: " + first.kind().words() + " has it at " + first.place(),
                    "regions, edges and airs share one set of names; give this " + kind.word() + " another");
        }
    }

    /** What the name stands for; empty where nothing has it. */
    Optional<Kind> kindOf(String name) {
        return Optional.ofNullable(entries.get(name)).map(Entry::kind);
    }

    /** All names of these kinds, in the order of their places. */
    List<String> all(Kind... kinds) {
        Set<Kind> wanted = Set.of(kinds);
        return entries.entrySet().stream()
                .filter(e -> wanted.contains(e.getValue().kind()))
                .map(Map.Entry::getKey)
                .toList();
    }

    /**
     * Whether the name stands for one of these kinds; an error, with the nearest right name, where not.
     *
     * @param name the name as the user wrote it
     * @param place where
     * @param what what it is written for, for the message: {@code 'peak' of ask 'hot'}
     * @param otherKind what to do when the name is of another kind; empty for nothing special
     * @param wanted the kinds that would be right
     */
    boolean check(String name, Place place, String what, String otherKind, Kind... wanted) {
        Optional<Kind> kind = kindOf(name);
        if (kind.isPresent() && !Collections.disjoint(entries.get(name).all(), List.of(wanted))) {
            return true;
        }
        String words =
                String.join(" or ", List.of(wanted).stream().map(Kind::words).toList());
        String word =
                String.join(" or ", List.of(wanted).stream().map(Kind::word).toList());
        String nearest = NearestWord.remedy(name, all(wanted), word);
        if (kind.isPresent()) {
            findings.error(
                    "wrong-kind",
                    place,
                    what + " names '" + name + "', which is " + kind.get().words() + ", where " + words + " is wanted",
                    otherKind.isEmpty() ? nearest : otherKind);
        } else {
            findings.error(
                    "unknown-name", place, what + " names '" + name + "', but no " + word + " has that name", nearest);
        }
        return false;
    }
}
