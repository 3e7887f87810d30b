package tepor.mesher.outline;

import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Collects what is found while a case is read, so that all of it is reported at once. */
public final class Findings {
    private final Set<Finding> list = new LinkedHashSet<>();

    /** Adds an error; see {@link Finding} for the parameters. */
    public void error(String code, Place place, String what, String remedy) {
        add(new Finding(Finding.Severity.ERROR, code, place, what, remedy));
    }

    /** Adds a warning; see {@link Finding} for the parameters. */
    public void warning(String code, Place place, String what, String remedy) {
        add(new Finding(Finding.Severity.WARNING, code, place, what, remedy));
    }

    /** Adds a note; see {@link Finding} for the parameters. */
    public void note(String code, Place place, String what, String remedy) {
        add(new Finding(Finding.Severity.NOTE, code, place, what, remedy));
    }

    /** Adds a finding, unless the very same one is here already. */
    public void add(Finding finding) {
        list.add(finding);
    }

    public boolean hasErrors() {
        return list.stream().anyMatch(f -> f.severity() == Finding.Severity.ERROR);
    }

    /** All findings in the order of their places. */
    public List<Finding> all() {
        return list.stream()
                .sorted(Comparator.comparing((Finding f) -> f.place().file())
                        .thenComparingInt(f -> f.place().line())
                        .thenComparingInt(f -> f.place().column()))
                .toList();
    }

    /** What goes along with an answer: warnings and notes, in the order of their places. */
    public List<Finding> warnings() {
        return all().stream()
                .filter(f -> f.severity() != Finding.Severity.ERROR)
                .toList();
    }

    /** @throws FaultyInputException if there is an error among the findings */
    public void throwIfFaulty() {
        if (hasErrors()) {
            throw new FaultyInputException(all());
        }
    }
}
