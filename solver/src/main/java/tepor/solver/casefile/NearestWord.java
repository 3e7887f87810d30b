package tepor.solver.casefile;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import tepor.mesher.outline.EditDistance;

/** Finds the known word that a mistyped one may have meant. */
final class NearestWord {
    private NearestWord() {}

    /**
     * The known word nearest to {@code word} by edit distance, upper and lower case being the same; empty where none is
     * so near that it is likely meant (more than two edits and more than two fifths of the word).
     */
    static Optional<String> to(String word, Collection<String> known) {
        int likely = Math.max(2, 2 * word.length() / 5);
        return known.stream()
                .filter(k -> distance(word, k) <= Math.min(likely, Math.max(word.length(), k.length()) - 1))
                .min(Comparator.comparingInt((String k) -> distance(word, k)));
    }

    /** A remedy: the nearest word where there is one, else all of them. */
    static String remedy(String word, Collection<String> known, String whatTheyAre) {
        if (known.isEmpty()) {
            return "there is no " + whatTheyAre + " in this case";
        }
        return to(word, known).map(near -> "did you mean '" + near + "'").orElseGet(() -> "known: " + list(known));
    }

    /** Words in single quotes, separated by commas; a dozen at most. */
    static String list(Collection<String> words) {
        String text = words.stream().limit(12).map(w -> "'" + w + "'").collect(Collectors.joining(", "));
        return words.size() > 12 ? text + " and " + (words.size() - 12) + " more" : text;
    }

    private static int distance(String first, String second) {
        return EditDistance.between(first.toLowerCase(Locale.ROOT), second.toLowerCase(Locale.ROOT));
    }
}
