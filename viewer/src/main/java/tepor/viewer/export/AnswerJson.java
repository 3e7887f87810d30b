package tepor.viewer.export;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Ledger;
import tepor.solver.answer.MeshError;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.viewer.wording.FlowDirection;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.VerdictWords;

/** Writes {@code answers.json}: coordinates in metres, everything else in the unit given beside it. */
public final class AnswerJson {
    private final Answer answer;
    private final Case subject;
    private final JsonText json;
    private final CommonJson common;

    private AnswerJson(Answer answer, JsonText json) {
        this.answer = answer;
        this.subject = answer.subject();
        this.json = json;
        this.common = new CommonJson(json);
    }

    /** Writes an answer as UTF-8; leaves the stream open. */
    public static void write(Answer answer, OutputStream out) throws IOException {
        try (JsonText json = new JsonText(out)) {
            new AnswerJson(answer, json).write();
        }
    }

    private void write() throws IOException {
        List<ShownAnswer> shown =
                answer.asks().stream().map(a -> ShownAnswer.of(a, subject)).toList();
        json.object(() -> {
            common.heading(subject);
            files();
            if (!subject.reportFields().isEmpty()) {
                json.object("report", () -> {
                    for (Map.Entry<String, String> field :
                            subject.reportFields().entrySet()) {
                        json.text(field.getKey(), field.getValue());
                    }
                });
            }
            mesh();
            solve();
            VerdictWords words = new VerdictWords(subject);
            json.array("answers", () -> {
                for (ShownAnswer one : shown) {
                    json.object(() -> ask(one, words));
                }
            });
            ledger(answer.ledger());
            common.insulated(answer.insulated(), subject.section());
            history(shown);
            common.warnings(answer.warnings());
        });
    }

    private void files() throws IOException {
        json.array("files", () -> {
            for (var file : subject.files()) {
                json.object(() -> {
                    json.text("name", file.name());
                    json.text("sha256", file.sha256());
                });
            }
        });
    }

    private void mesh() throws IOException {
        json.object("mesh", () -> {
            json.text("element", answer.mesh().mesh().nodesPerTriangle() == 6 ? "quadratic" : "linear");
            common.meshFigures(answer.mesh());
            json.whole("rounds", answer.history().size());
            json.number("seconds", answer.figures().secondsMesh());
        });
    }

    private void solve() throws IOException {
        Answer.Figures figures = answer.figures();
        json.object("solve", () -> {
            json.whole("unknowns", figures.unknowns());
            json.whole("iterations", figures.iterations());
            json.number("residual", figures.residual());
            json.number("seconds_assembly", figures.secondsAssembly());
            json.number("seconds_linear", figures.secondsLinear());
            json.number("seconds_all", figures.secondsAll());
        });
    }

    private void ask(ShownAnswer shown, VerdictWords words) throws IOException {
        json.text("name", shown.name());
        json.text("kind", shown.ask().kind());
        json.number("value", shown.value());
        json.text("unit", unit(shown.unit()));
        if (shown.ask() instanceof Ask.Flow flow) {
            json.text("positive", FlowDirection.words(flow, subject.section()));
        }
        double[] where = shown.source().where();
        if (where != null) {
            common.point("where", where[0], where[1]);
        }
        if (shown.forDepth() != null) {
            json.object("for_depth", () -> {
                json.number("value", shown.forDepth());
                json.text("unit", "W");
            });
        }
        if (shown.deviation() != null) {
            MeshError error = shown.source().meshError();
            json.object("mesh_error", () -> {
                json.number("low", shown.deviation().low());
                json.number("high", shown.deviation().high());
                json.text("kind", error.kind().name().toLowerCase(Locale.ROOT));
                json.number("within", shown.deviation().within());
                json.truth("reached", error.reached());
            });
        }
        json.array("interval", () -> {
            json.number(shown.low());
            json.number(shown.high());
        });
        json.number("confidence", subject.accuracy().confidence());
        if (shown.limit() != null) {
            json.object("limit", () -> limit(shown, words));
        }
        if (shown.handCheck() != null) {
            json.object("hand_check", () -> {
                json.number("low", shown.handLow());
                json.number("high", shown.handHigh());
                json.text("unit", unit(shown.unit()));
                json.truth("inside", shown.handCheck().inside());
                json.array("working", () -> {
                    for (String line : shown.handCheck().working()) {
                        json.text(line);
                    }
                });
            });
        }
    }

    private void limit(ShownAnswer shown, VerdictWords words) throws IOException {
        ShownAnswer.ShownLimit limit = shown.limit();
        json.text("relation", limit.relation().sign());
        json.number("value", limit.value());
        json.text("unit", unit(limit.unit()));
        json.number("margin", limit.margin());
        json.text("verdict", limit.verdict() == null ? null : limit.verdict().word());
        json.text("words", words.of(shown));
    }

    private void ledger(Ledger ledger) throws IOException {
        json.object("ledger", () -> {
            json.text("unit", "W/m");
            json.array("rows", () -> {
                for (Ledger.Row row : ledger.rows()) {
                    json.object(() -> {
                        json.text("name", row.name());
                        json.text("kind", row.kind());
                        json.number("in", row.in());
                        if (row.dependsOnMesh()) {
                            json.truth("depends_on_mesh", true);
                        }
                    });
                }
            });
            json.number("imbalance", ledger.imbalance());
        });
    }

    private void history(List<ShownAnswer> shown) throws IOException {
        json.array("history", () -> {
            for (Answer.Round round : answer.history()) {
                json.object(() -> {
                    json.whole("round", round.round());
                    json.whole("triangles", round.triangles());
                    json.array("answers", () -> {
                        for (int i = 0; i < shown.size(); i++) {
                            roundAnswer(shown.get(i), round, i);
                        }
                    });
                });
            }
        });
    }

    private void roundAnswer(ShownAnswer shown, Answer.Round round, int iAsk) throws IOException {
        ShownAnswer.Deviation error = shown.deviationOf(round, iAsk);
        json.object(() -> {
            json.text("name", shown.name());
            json.number("value", shown.valueOf(round, iAsk));
            json.number("low", error == null ? Double.NaN : error.low());
            json.number("high", error == null ? Double.NaN : error.high());
        });
    }

    /** A pure number's unit is said as 1. */
    private static String unit(String unit) {
        return unit.isEmpty() ? "1" : unit;
    }
}
