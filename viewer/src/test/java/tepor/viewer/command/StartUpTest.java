package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** A faulty case ends the process while the start-up thread still loads: no trace may mix with the messages. */
class StartUpTest {
    @Test
    void aFailureInTheBackgroundPrintsNothing() throws Exception {
        ByteArrayOutputStream printed = new ByteArrayOutputStream();
        PrintStream before = System.err;
        System.setErr(new PrintStream(printed, true, StandardCharsets.UTF_8));
        try {
            StartUp.inBackground(() -> {
                        throw new ExceptionInInitializerError("the font cannot be read");
                    })
                    .join();
        } finally {
            System.setErr(before);
        }
        assertThat(printed.toString(StandardCharsets.UTF_8)).isEmpty();
    }
}
