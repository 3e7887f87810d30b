package tepor.viewer.command;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * Ctrl-C: tells the computation to stop, and gives it time to remove what it has half written, before the process ends.
 */
final class Interruption {
    private static final long SECONDS_TO_TIDY = 10;

    private final AtomicBoolean stopped = new AtomicBoolean();
    private final CountDownLatch tidy = new CountDownLatch(1);

    /** Listens for the end of the process. */
    static Interruption listen() {
        Interruption interruption = new Interruption();
        Runtime.getRuntime().addShutdownHook(new Thread(interruption::stopAndWait, "tepor-interruption"));
        return interruption;
    }

    private void stopAndWait() {
        stopped.set(true);
        try {
            if (!tidy.await(SECONDS_TO_TIDY, TimeUnit.SECONDS)) {
                Thread.currentThread().interrupt();
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    boolean stopped() {
        return stopped.get();
    }

    /** Nothing is half written any more: the process may end. */
    void tidied() {
        tidy.countDown();
    }
}
