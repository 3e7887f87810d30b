package tepor.solver.casefile;

import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** How paths to inputs are written: {@code edge.outer skin.film}; a name with a dot is quoted. */
final class Paths {
    private static final Pattern BARE = Pattern.compile("[A-Za-z0-9_-]+");

    private Paths() {}

    /** The path that these steps make. */
    static String of(String... steps) {
        return List.of(steps).stream().map(Paths::step).collect(Collectors.joining("."));
    }

    /** Whether TOML takes the name as a key without quotes. */
    static boolean isBare(String name) {
        return BARE.matcher(name).matches();
    }

    private static String step(String name) {
        return name.contains(".") ? "\"" + name + "\"" : name;
    }
}
