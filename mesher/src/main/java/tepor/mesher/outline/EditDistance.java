package tepor.mesher.outline;

/** How far two words are apart in letters, to guess what a mistyped one may have meant. */
public final class EditDistance {
    private EditDistance() {}

    /**
     * Number of letters to insert, delete or change, or of neighbours to swap, that turn one word into the other (optimal
     * string alignment; F. J. Damerau, Commun. ACM 7 (1964) 171–176). Upper and lower case differ.
     */
    public static int between(String a, String b) {
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    d[i][j] = i + j;
                    continue;
                }
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                d[i][j] = Math.min(Math.min(d[i - 1][j], d[i][j - 1]) + 1, d[i - 1][j - 1] + change);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
                }
            }
        }
        return d[a.length()][b.length()];
    }
}
