package tepor.viewer.command;

import java.io.IOException;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Units;
import tepor.viewer.export.PictureFiles;

/**
 * Loads on a thread of its own what an answer will need later, units first, then drawing: a case is read, meshed and solved
 * on one thread, so a second core has the time.
 */
final class StartUp {
    private StartUp() {}

    static void inBackground() {
        inBackground(StartUp::load);
    }

    /**
     * Runs a load whose failure is silent: where what failed is needed, it fails again with a message; and a process that ends
     * early, say at a faulty case, takes files and classes away from under a load that is still running.
     */
    static Thread inBackground(Runnable load) {
        Thread thread = new Thread(load, "start-up");
        thread.setDaemon(true);
        thread.setUncaughtExceptionHandler((failed, reason) -> {});
        thread.start();
        return thread;
    }

    private static void load() {
        Units.fromSi(0, Dimension.CONDUCTIVITY.unit(), Dimension.CONDUCTIVITY);
        try {
            PictureFiles.warmUp();
        } catch (IOException e) {
            // Nothing is lost but time; the picture itself will say what is wrong.
            return;
        }
    }
}
