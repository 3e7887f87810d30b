package tepor.viewer.command;

import java.io.PrintStream;
import java.util.List;
import tepor.mesher.outline.Finding;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Insulated;
import tepor.solver.answer.Ledger;
import tepor.solver.model.Case;
import tepor.viewer.wording.AskWords;
import tepor.viewer.wording.InsulatedRun;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.VerdictWords;

/** An answer as text for a terminal. */
final class AnswerText {
    private static final int DIGITS = 6;

    private final Answer answer;
    private final Case subject;
    private final PrintStream out;

    AnswerText(Answer answer, PrintStream out) {
        this.answer = answer;
        this.subject = answer.subject();
        this.out = out;
    }

    void print() {
        List<ShownAnswer> shown =
                answer.asks().stream().map(a -> ShownAnswer.of(a, subject)).toList();
        out.println(subject.title().isEmpty() ? subject.name() : subject.name() + ": " + subject.title());
        out.println();
        answers(shown);
        verdicts(shown);
        handChecks(shown);
        ledger();
        insulated(answer.insulated(), subject, out);
    }

    private void answers(List<ShownAnswer> shown) {
        TextTable table = new TextTable("answer", "#value", "#mesh error", "unit", "limit", "verdict");
        for (ShownAnswer one : shown) {
            double half = one.deviation() == null ? Double.NaN : one.deviation().halfWidth();
            boolean missed =
                    one.deviation() != null && !one.source().meshError().reached();
            table.row(
                    one.name(),
                    Rounding.value(one.value(), half),
                    "± " + Rounding.error(half) + (missed ? " (!)" : ""),
                    one.unit(),
                    AskWords.limit(one.ask()),
                    one.limit() == null || one.limit().verdict() == null
                            ? ""
                            : one.limit().verdict().word());
            if (one.forDepth() != null) {
                String depth = "  for " + subject.depth().quantity().text();
                table.row(depth, Rounding.significant(one.forDepth(), DIGITS), "", "W", "", "");
            }
        }
        table.lines().forEach(out::println);
        if (shown.stream()
                .anyMatch(s -> s.deviation() != null && !s.source().meshError().reached())) {
            out.println("  (!) not as close as was asked for");
        }
    }

    private void verdicts(List<ShownAnswer> shown) {
        VerdictWords words = new VerdictWords(subject);
        boolean first = true;
        for (ShownAnswer one : shown) {
            String verdict = words.of(one);
            if (!verdict.isEmpty()) {
                if (first) {
                    out.println();
                }
                out.println("  " + one.name() + ": " + verdict);
                first = false;
            }
        }
    }

    private void handChecks(List<ShownAnswer> shown) {
        for (ShownAnswer one : shown) {
            if (one.handCheck() != null) {
                out.println();
                out.println("Hand check of " + one.name() + ": between " + Rounding.significant(one.handLow(), DIGITS)
                        + " and " + Rounding.significant(one.handHigh(), DIGITS) + " " + one.unit() + "; computed "
                        + (one.handCheck().inside() ? "inside" : "OUTSIDE"));
                one.handCheck().working().forEach(line -> out.println("  " + line));
            }
        }
    }

    private void ledger() {
        TextTable table = new TextTable("where", "by", "#W/m into the section");
        for (Ledger.Row row : answer.ledger().rows()) {
            table.row(
                    row.name() + (row.dependsOnMesh() ? " (*)" : ""),
                    row.kind(),
                    Rounding.significant(row.in(), DIGITS));
        }
        out.println();
        out.println(
                "Heat ledger (imbalance " + Rounding.significant(answer.ledger().imbalance(), 2) + ")");
        table.lines().forEach(out::println);
        if (answer.ledger().rows().stream().anyMatch(Ledger.Row::dependsOnMesh)) {
            out.println("  (*) grows with every refinement: two different fixed temperatures meet");
        }
    }

    /** What is insulated by default, and where. */
    static void insulated(Insulated insulated, Case subject, PrintStream out) {
        out.println();
        if (insulated.stated() > 0) {
            out.println("Stated as insulated: " + subject.unit().length(insulated.stated()));
        }
        out.println("Insulated because nothing was stated: "
                + (insulated.byDefault() > 0 ? subject.unit().length(insulated.byDefault()) : "none"));
        for (InsulatedRun run : InsulatedRun.of(insulated, subject.section())) {
            out.println("  " + run.words(subject.unit()));
        }
    }

    /** Warnings, one line each. */
    static void warnings(List<Finding> warnings, PrintStream err) {
        warnings.forEach(err::println);
    }
}
