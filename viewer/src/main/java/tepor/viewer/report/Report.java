package tepor.viewer.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import java.util.List;
import tepor.mesher.outline.Finding;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Insulated;
import tepor.solver.model.Case;
import tepor.solver.model.SourceFile;
import tepor.viewer.export.InputsDigest;
import tepor.viewer.export.PictureFile;
import tepor.viewer.export.Version;
import tepor.viewer.wording.InsulatedRun;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;

/** Writes {@code report.html}: everything a checker needs on one page that names no other file. */
public final class Report {
    private final Answer answer;
    private final Case subject;
    private final List<PictureFile> pictures;
    private final HtmlText html;

    private Report(Answer answer, List<PictureFile> pictures, HtmlText html) {
        this.answer = answer;
        this.subject = answer.subject();
        this.pictures = pictures;
        this.html = html;
    }

    /**
     * Writes the report as UTF-8; leaves the stream open.
     *
     * @param pictures set into the page in this order
     */
    public static void write(Answer answer, List<PictureFile> pictures, OutputStream out) throws IOException {
        new Report(answer, pictures, new HtmlText(out)).write();
    }

    private void write() throws IOException {
        List<ShownAnswer> shown =
                answer.asks().stream().map(a -> ShownAnswer.of(a, subject)).toList();
        html.page(() -> {
            html.element("head", this::head);
            html.text("\n");
            html.element("body", () -> {
                new TitleBlock(subject, html).write();
                new AnswerTable(subject, shown, html).write();
                pictures();
                html.section("Where the heat comes from and goes to", () -> new LedgerTable(answer, html).write());
                html.section("Insulated boundary", this::insulated);
                new HandChecks(shown, html).write();
                html.section("Inputs", () -> new InputTable(subject, html).write());
                html.section("Mesh and solution", () -> new MeshTable(answer, shown, html).write());
                html.section("Warnings", this::warnings);
                new Cautions(html).write();
                html.section("Versions and files", this::files);
            });
        });
    }

    private void head() throws IOException {
        html.empty("meta", List.of("charset", "utf-8"));
        html.empty("meta", List.of("name", "viewport", "content", "width=device-width, initial-scale=1"));
        html.element("title", subject.title().isEmpty() ? subject.name() : subject.title());
        html.element("style", style());
    }

    private static String style() throws IOException {
        try (InputStream in = Report.class.getResourceAsStream("report.css")) {
            return "\n" + new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    private void pictures() throws IOException {
        if (pictures.isEmpty()) {
            return;
        }
        html.section("Temperatures", () -> {
            for (PictureFile picture : pictures) {
                String data = "data:" + picture.mediaType() + ";base64,"
                        + Base64.getEncoder().encodeToString(picture.bytes());
                html.element("figure", () -> {
                    html.empty("img", List.of("src", data, "alt", picture.description()));
                    html.element("figcaption", picture.description());
                });
            }
        });
    }

    private void insulated() throws IOException {
        Insulated insulated = answer.insulated();
        html.element(
                "p",
                "Stated as insulated: " + subject.unit().length(insulated.stated())
                        + ". Insulated because nothing was stated: "
                        + subject.unit().length(insulated.byDefault()) + ".");
        List<InsulatedRun> runs = InsulatedRun.of(insulated, subject.section());
        if (!runs.isEmpty()) {
            html.element("ul", () -> {
                for (InsulatedRun run : runs) {
                    html.element("li", run.words(subject.unit()));
                }
            });
        }
    }

    private void warnings() throws IOException {
        if (answer.warnings().isEmpty()) {
            html.element("p", "None.");
            return;
        }
        html.element("ul", () -> {
            for (Finding finding : answer.warnings()) {
                html.element("li", () -> {
                    String note = finding.severity() == Finding.Severity.NOTE ? "Note: " : "";
                    html.text(
                            note + finding.what() + (finding.remedy().isEmpty() ? "" : "; " + finding.remedy()) + " ");
                    html.element("span", "place", finding.place().toString());
                });
            }
        });
    }

    private void files() throws IOException {
        html.element(
                "p",
                "Calculated by Tepor " + Version.text() + " on Java "
                        + Runtime.version().feature() + ".");
        html.element(
                "div",
                List.of("class", "scroll"),
                () -> html.element("table", () -> {
                    html.tableHead(List.of("File", "SHA-256"));
                    html.element("tbody", () -> {
                        for (SourceFile file : subject.files()) {
                            digest(file.name(), file.sha256());
                        }
                        digest("all of them (the digest of the lines above)", InputsDigest.of(subject.files()));
                    });
                }));
        html.element(
                "p",
                "note",
                "The last digest is that of the others, each followed by a line feed: the same inputs give the same digest. "
                        + "Computed in " + Rounding.significant(answer.figures().secondsAll(), 3) + " s.");
    }

    private void digest(String name, String sha256) throws IOException {
        html.element("tr", () -> {
            html.element("td", name);
            html.element("td", () -> html.element("code", sha256));
        });
    }
}
