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
        Thread thread = new Thread(StartUp::load, "start-up");
        thread.setDaemon(true);
        // Nothing is lost but time, and no trace belongs on the terminal: what is wrong shows again where it is needed.
        thread.setUncaughtExceptionHandler((broken, failure) -> {});
        thread.start();
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
