package tepor.viewer.command;

import java.util.function.BooleanSupplier;
import me.tongfei.progressbar.DelegatingProgressBarConsumer;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;
import tepor.solver.answer.Progress;
import tepor.viewer.wording.Rounding;

/**
 * Progress of one case on the error stream: on a terminal a line drawn over and over, elsewhere one line for each round, and
 * only once the work has taken a second.
 */
final class ProgressLine implements Progress, AutoCloseable {
    private static final int WIDTH = 100;
    private static final long QUIET_NANOS = 1_000_000_000L;

    private final Terminal terminal;
    private final BooleanSupplier stopped;
    private final String name;
    private final long begin = System.nanoTime();
    private ProgressBar bar;

    ProgressLine(String name, Terminal terminal, BooleanSupplier stopped) {
        this.name = name;
        this.terminal = terminal;
        this.stopped = stopped;
    }

    @Override
    public void round(int round, int triangles, double widest) {
        String text = "round " + round + ", " + triangles + " triangles"
                + (Double.isFinite(widest)
                        ? ", widest mesh error " + Rounding.significant(widest, 2) + " of its tolerance"
                        : "");
        if (terminal.interactive()) {
            // An error of n times the tolerance is 1/n of the way; clamped, since it can be 0 or unknown.
            long done = Double.isFinite(widest) ? Math.round(100 / Math.max(1, widest)) : 0;
            bar().stepTo(Math.max(0, Math.min(100, done)));
            show(text);
        } else if (isLong()) {
            show(text);
        }
    }

    @Override
    public void stage(String what) {
        if (terminal.interactive() && isLong()) {
            show(what);
        }
    }

    @Override
    public boolean stopped() {
        return stopped.getAsBoolean();
    }

    private boolean isLong() {
        return System.nanoTime() - begin > QUIET_NANOS;
    }

    private void show(String text) {
        if (terminal.interactive()) {
            bar().setExtraMessage(" " + text);
        } else {
            terminal.err().println(name + ": " + text);
        }
    }

    private ProgressBar bar() {
        if (bar == null) {
            bar = new ProgressBarBuilder()
                    .setTaskName(name)
                    .setInitialMax(100)
                    .setStyle(ProgressBarStyle.ASCII)
                    .setConsumer(new DelegatingProgressBarConsumer(
                            text -> terminal.err().print("\r" + text), WIDTH))
                    .hideEta()
                    .build();
        }
        return bar;
    }

    /** Takes the line away. */
    @Override
    public void close() {
        if (bar != null) {
            bar.close();
            terminal.err().print("\r" + " ".repeat(WIDTH) + "\r");
        }
    }
}
