package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;
import static tepor.viewer.command.CommandFixture.caseFile;

import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Place;
import tepor.solver.answer.UnfinishedException;
import tepor.solver.answer.Verdict;
import tepor.viewer.BusbarSample;

class AnswerCommandTest {
    @TempDir
    Path place;

    private final CommandFixture fixture = new CommandFixture();
    private Path duct;
    private Path out;

    @BeforeEach
    void makeCase() throws IOException {
        duct = caseFile(place, "duct");
        out = place.resolve("out");
    }

    private List<String> written() throws IOException {
        try (var files = Files.walk(place)) {
            return files.filter(Files::isRegularFile)
                    .map(f -> place.relativize(f).toString())
                    .filter(n -> !n.endsWith(".toml"))
                    .sorted()
                    .toList();
        }
    }

    @Test
    void writesAllFilesAndPrintsTheAnswers() throws IOException {
        assertThat(fixture.run("answer", duct, "--out", out)).isZero();
        assertThat(written())
                .containsExactly("out/answers.json", "out/isotherms.png", "out/isotherms.svg", "out/report.html");
        assertThat(new ObjectMapper()
                        .readTree(out.resolve("answers.json").toFile())
                        .at("/case")
                        .asText())
                .isEqualTo("duct");
        assertThat(out.resolve("report.html")).content().contains("data:image/png;base64,");
        assertThat(fixture.out())
                .containsPattern("hottest bar +96\\.370 +± 0\\.050 +degC +<= 105 degC +met\n")
                .contains("hottest bar: met, by 8.630 K; 6 inputs taken as exact")
                .containsPattern("heat to the room +42\\.000 +± 0\\.050 +W/m")
                .containsPattern("for 2\\.5 m +105 +W")
                .contains("Hand check of heat to the room: between 40 and 43.5 W/m; computed inside")
                .contains("R = 0.12 m / 0.65")
                .containsPattern("outer skin +film +-42")
                .contains("440 mm from (0 120) mm to (200 120) mm")
                .contains("Written to " + out);
        assertThat(fixture.err()).isEqualTo("case.toml:12:3: warning: 2 inputs state a spread <b>; nothing to do\n");
    }

    @Test
    void takesAFolderWithACaseToml() throws IOException {
        Path folder = Files.createDirectory(place.resolve("02-duct"));
        caseFile(folder, "case");
        assertThat(fixture.run("answer", folder, "--out", out)).isZero();
        assertThat(fixture.out()).startsWith("02-duct: ");
    }

    @Test
    void tellsByItsStatusHowLimitsStand() {
        assertThat(fixture.sample("duct", () -> new BusbarSample().verdict(Verdict.BROKEN))
                        .run("answer", duct, "--out", out))
                .isEqualTo(1);
        assertThat(fixture.sample("duct", () -> new BusbarSample().verdict(Verdict.UNDECIDED))
                        .run("answer", duct, "--out", out))
                .isEqualTo(2);
        assertThat(fixture.sample("duct", () -> new BusbarSample().verdict(null))
                        .run("answer", duct, "--out", out))
                .isZero();
    }

    @Test
    void reportsEveryFindingOfAFaultyCaseAndWritesNothing() throws IOException {
        fixture.failReading(new FaultyInputException(List.of(
                new Finding(
                        Finding.Severity.ERROR, "a", new Place("duct.toml", 3, 5), "unknown key heet", "heat is meant"),
                new Finding(Finding.Severity.ERROR, "b", new Place("duct.wkt", 7, 0), "not closed", "close it"))));
        assertThat(fixture.run("answer", duct, "--out", out)).isEqualTo(3);
        assertThat(fixture.err())
                .isEqualTo("duct.toml:3:5: error: unknown key heet; heat is meant\n"
                        + "duct.wkt:7: error: not closed; close it\n2 errors; nothing was written\n");
        assertThat(fixture.out()).isEmpty();
        assertThat(written()).isEmpty();
    }

    @Test
    void saysWhichFileIsNotThereAndWhatIs() {
        assertThat(fixture.run("answer", place.resolve("dukt.toml"))).isEqualTo(3);
        assertThat(fixture.err()).contains("dukt.toml: error: there is no such file; there is duct.toml");
        assertThat(new CommandFixture().run("answer", place)).isEqualTo(3);
    }

    @Test
    void saysWhyAComputationWasNotFinished() throws IOException {
        fixture.failAnswering(new UnfinishedException("the equations did not converge"));
        assertThat(fixture.run("answer", duct, "--out", out)).isEqualTo(4);
        assertThat(fixture.err()).contains("not finished: the equations did not converge");
        assertThat(written()).isEmpty();
    }

    @Test
    void saysHowToGetMoreMemory() {
        fixture.failAnswering(new OutOfMemoryError("Java heap space"));
        assertThat(fixture.run("answer", duct, "--out", out)).isEqualTo(4);
        assertThat(fixture.err()).contains("MB of memory were not enough", "-Xmx");
    }

    @Test
    void stopsCleanlyWhenTold() throws IOException {
        fixture.stop();
        assertThat(fixture.run("answer", duct, "--out", out)).isEqualTo(4);
        assertThat(fixture.err()).contains("stopped; nothing was written");
        assertThat(new CommandFixture()
                        .failAnswering(new CancellationException())
                        .run("answer", duct, "--out", out))
                .isEqualTo(4);
        assertThat(written()).isEmpty();
    }

    @Test
    void reportsAnUnexpectedFailureWithoutItsTraceUnlessAsked() {
        fixture.failAnswering(new IndexOutOfBoundsException("Index 7"));
        assertThat(fixture.run("answer", duct, "--out", out)).isEqualTo(4);
        assertThat(fixture.err()).contains("unexpected failure: IndexOutOfBoundsException: Index 7", "Please report");
        assertThat(fixture.err()).doesNotContain("\tat ");
        assertThat(fixture.run("--debug", "answer", duct, "--out", out)).isEqualTo(4);
        assertThat(fixture.err()).contains("\tat ");
    }

    @Test
    void saysInPlainWordsThatItCannotWrite() throws IOException {
        Path inTheWay = Files.writeString(place.resolve("taken"), "a file");
        assertThat(fixture.run("answer", duct, "--out", inTheWay)).isEqualTo(4);
        assertThat(fixture.err()).contains("cannot write " + inTheWay + ": a file of this name is in the way");
        assertThat(written()).containsExactly("taken");
    }

    @Test
    void answersSeveralCasesAndEndsWithTheWorstStatus() throws IOException {
        Path second = caseFile(place, "second");
        Path third = caseFile(place, "third");
        fixture.sample("duct", () -> new BusbarSample().verdict(Verdict.BROKEN))
                .sample("second", () -> new BusbarSample().verdict(Verdict.UNDECIDED));
        assertThat(fixture.run("answer", second, duct, third, "--out", out)).isEqualTo(1);
        assertThat(written()).contains("out/duct-answer/answers.json", "out/third-answer/report.html");
        assertThat(written()).hasSize(12);
        assertThat(fixture.run("answer", duct, place.resolve("gone.toml"), third, "--out", out))
                .isEqualTo(3);
    }

    @Test
    void refusesTwoCasesThatWouldShareAFolder() throws IOException {
        Path other = caseFile(Files.createDirectory(place.resolve("other")), "duct");
        assertThat(fixture.run("answer", duct, other, "--out", out)).isEqualTo(64);
        assertThat(fixture.err()).contains("would both be written to duct-answer");
        assertThat(written()).isEmpty();
    }

    @Test
    void writesTheEquationsOfOneCase() throws IOException {
        assertThat(fixture.run("answer", duct, "--out", out, "--system", place.resolve("eq")))
                .isZero();
        assertThat(written()).contains("eq.mtx", "eq_rhs.mtx");
        assertThat(fixture.run("answer", duct, caseFile(place, "b"), "--system", place.resolve("eq")))
                .isEqualTo(64);
    }

    @Test
    void drawsMeshAndFluxWhenAsked() throws IOException {
        fixture.run("answer", duct, "--out", out);
        fixture.run("answer", duct, "--out", place.resolve("more"), "--mesh", "--flux");
        assertThat(Files.size(place.resolve("more/isotherms.svg")))
                .isGreaterThan(Files.size(out.resolve("isotherms.svg")));
    }
}
