package tepor.solver.answer;

/** Whether a limit holds (JCGM 106:2012, with the third value where it cannot be said). */
public enum Verdict {
    MET("met"),
    BROKEN("broken"),
    UNDECIDED("undecided");

    private final String word;

    Verdict(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
