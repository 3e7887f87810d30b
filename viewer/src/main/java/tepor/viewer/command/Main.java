package tepor.viewer.command;

/** The process. */
public final class Main {
    private static final String NETLIB = "com.github.fommil.netlib.";

    private Main() {}

    /** Runs one command and ends the process with its status. */
    public static void main(String[] args) {
        // The linear algebra library would look for native libraries and log that it found none.
        setUnlessSet(NETLIB + "BLAS", NETLIB + "F2jBLAS");
        setUnlessSet(NETLIB + "LAPACK", NETLIB + "F2jLAPACK");
        setUnlessSet("java.awt.headless", "true");
        Interruption interruption = Interruption.listen();
        Terminal terminal = Terminal.ofProcess();
        Status status = new CommandRun(Calculation.SOLVER, terminal, interruption::stopped).run(args);
        terminal.out().flush();
        terminal.err().flush();
        if (terminal.out().checkError() && status.compareTo(Status.UNFINISHED) < 0) {
            status = Status.UNFINISHED;
        }
        interruption.tidied();
        System.exit(status.code());
    }

    private static void setUnlessSet(String key, String value) {
        if (System.getProperty(key) == null) {
            System.setProperty(key, value);
        }
    }
}
