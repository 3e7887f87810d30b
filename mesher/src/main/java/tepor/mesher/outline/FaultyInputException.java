package tepor.mesher.outline;

import java.util.List;
import java.util.stream.Collectors;

/** What a user wrote cannot be answered; carries every finding, not only the first. */
public final class FaultyInputException extends RuntimeException {
    private final transient List<Finding> findings;

    public FaultyInputException(List<Finding> findings) {
        super(findings.stream().map(Finding::toString).collect(Collectors.joining("\n")));
        this.findings = List.copyOf(findings);
    }

    /** All findings, errors and warnings, in the order of their places. */
    public List<Finding> findings() {
        return findings;
    }
}
