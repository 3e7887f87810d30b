package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class CommandLineTest {
    private final CommandFixture fixture = new CommandFixture();

    @Test
    void helpsAndTellsItsVersion() {
        assertThat(fixture.run("--help")).isZero();
        assertThat(fixture.out()).contains("answer", "inspect", "Exit status: 0", "64 wrong command line");
        assertThat(fixture.run("--version")).isZero();
        assertThat(fixture.out()).containsPattern("tepor \\d+\\.\\d+\\.\\d+");
        assertThat(fixture.run("answer", "--help")).isZero();
        assertThat(fixture.err()).isEmpty();
    }

    @Test
    void namesTheNearestOption() {
        assertThat(fixture.run("answer", "--fluks", "case.toml")).isEqualTo(64);
        assertThat(fixture.err()).contains("--fluks", "--flux");
    }

    @Test
    void namesTheNearestCommand() {
        assertThat(fixture.run("anser", "case.toml")).isEqualTo(64);
        assertThat(fixture.err()).contains("anser", "tepor answer");
    }

    @Test
    void saysWhatIsMissing() {
        assertThat(fixture.run()).isEqualTo(64);
        assertThat(fixture.err()).contains("say what to do: answer or inspect");
        assertThat(fixture.run("answer")).isEqualTo(64);
        assertThat(fixture.err()).contains("CASE");
        assertThat(fixture.run("answer", "case.toml", "--out")).isEqualTo(64);
    }

    @Test
    void ranksStatusesFromBestToWorst() {
        assertThat(Status.ANSWERED.or(Status.UNDECIDED).code()).isEqualTo(2);
        assertThat(Status.BROKEN.or(Status.UNDECIDED).code()).isEqualTo(1);
        assertThat(Status.BROKEN.or(Status.UNFINISHED).code()).isEqualTo(4);
        assertThat(Status.FAULTY.or(Status.UNFINISHED).code()).isEqualTo(3);
    }
}
