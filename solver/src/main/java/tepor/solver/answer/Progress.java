package tepor.solver.answer;

/** Told how far a long computation is; can stop it. Called from the computing thread. */
public interface Progress {
    /** Says nothing, never stops. */
    Progress NONE = new Progress() {
        @Override
        public void round(int round, int triangles, double widestRelativeToWithin) {}

        @Override
        public void stage(String what) {}

        @Override
        public boolean stopped() {
            return false;
        }
    };

    /**
     * A round of refinement is done.
     *
     * @param round from 1
     * @param triangles of its mesh
     * @param widestRelativeToWithin mesh error of the ask that is worst off, relative to its tolerance; NaN where none can
     *     be said yet
     */
    void round(int round, int triangles, double widestRelativeToWithin);

    /** A stage begins, such as "meshing". */
    void stage(String what);

    /** Whether the computation is to stop; it then throws {@link java.util.concurrent.CancellationException}. */
    boolean stopped();
}
