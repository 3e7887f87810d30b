package tepor.viewer.wording;

import java.util.List;
import tepor.solver.answer.MeshError;
import tepor.solver.model.Case;
import tepor.solver.model.Input;

/** A verdict in words: what it is, by how much, and what was taken as exact for it. */
public final class VerdictWords {
    private final int inputCount;
    private final int spreadCount;

    /** @param subject the case whose limits are judged */
    public VerdictWords(Case subject) {
        List<Input> inputs = subject.inputs().all();
        this.inputCount = inputs.size();
        this.spreadCount =
                (int) inputs.stream().filter(i -> i.quantity().hasSpread()).count();
    }

    /** The verdict on the answer's limit as one sentence without a full stop; empty where it has no limit. */
    public String of(ShownAnswer answer) {
        ShownAnswer.ShownLimit limit = answer.limit();
        if (limit == null || limit.verdict() == null) {
            return "";
        }
        String distance = distance(answer, limit);
        return switch (limit.verdict()) {
            case MET -> "met, by " + distance + "; " + exact();
            case BROKEN ->
                "broken, by " + distance + (isWithinMesh(answer) ? ", less than the mesh error" : "") + "; " + exact();
            case UNDECIDED -> "undecided: " + undecided(answer, limit, distance);
        };
    }

    private String undecided(ShownAnswer answer, ShownAnswer.ShownLimit limit, String distance) {
        ShownAnswer.Deviation error = answer.deviation();
        if (error == null || !Double.isFinite(error.halfWidth())) {
            return "how far off the mesh may be is not known";
        }
        if (isWithinMesh(answer)) {
            return "the limit lies within the mesh interval";
        }
        return (limit.margin() >= 0 ? "kept" : "broken") + " by " + distance + " at the stated values, but "
                + notCounted();
    }

    /** Whether a known mesh error could turn the verdict. */
    private static boolean isWithinMesh(ShownAnswer answer) {
        MeshError error = answer.source().meshError();
        double margin = answer.ask().head().limit().margin(answer.source().value());
        return error != null
                && Double.isFinite(error.high() - error.low())
                && Math.abs(margin) <= Math.max(Math.abs(error.low()), Math.abs(error.high()));
    }

    private static String distance(ShownAnswer answer, ShownAnswer.ShownLimit limit) {
        double margin = Math.abs(limit.margin());
        boolean sameUnit = answer.unit().equals(limit.unit()) && answer.deviation() != null;
        String figure =
                sameUnit ? Rounding.value(margin, answer.deviation().halfWidth()) : Rounding.significant(margin, 4);
        return limit.marginUnit().isEmpty() ? figure : figure + " " + limit.marginUnit();
    }

    private String notCounted() {
        return spreadCount == 0
                ? "how far off the " + inputCount + " inputs may be is not stated"
                : "the spreads of " + spreadCount + " of " + inputCount + " inputs are not counted yet";
    }

    private String exact() {
        return inputCount == 1 ? "1 input taken as exact" : inputCount + " inputs taken as exact";
    }
}
