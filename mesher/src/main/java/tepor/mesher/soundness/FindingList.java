package tepor.mesher.soundness;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;

/** Findings of which there may be thousands: of each kind the gravest are told one by one, the others counted. */
final class FindingList {
    private static final int TOLD_AT_MOST = 10;

    private record Weighed(Finding finding, double weight) {}

    private final Map<String, List<Weighed>> byCode = new LinkedHashMap<>();

    /** @param weight the less, the graver */
    void add(Finding finding, double weight) {
        byCode.computeIfAbsent(finding.code() + finding.severity(), c -> new ArrayList<>())
                .add(new Weighed(finding, weight));
    }

    /** Tells what was added; errors are told one by one, however many. */
    void tell(Findings findings) {
        for (List<Weighed> list : byCode.values()) {
            list.sort(Comparator.comparingDouble(Weighed::weight));
            Finding.Severity severity = list.get(0).finding().severity();
            int told = severity == Finding.Severity.ERROR ? list.size() : Math.min(TOLD_AT_MOST, list.size());
            list.subList(0, told).forEach(w -> findings.add(w.finding()));
            if (told < list.size()) {
                Finding next = list.get(told).finding();
                int more = list.size() - told;
                findings.add(new Finding(
                        severity,
                        next.code(),
                        next.place(),
                        more + (more == 1 ? " more finding" : " more findings") + " of this kind, the gravest: "
                                + next.what(),
                        next.remedy()));
            }
        }
    }
}
