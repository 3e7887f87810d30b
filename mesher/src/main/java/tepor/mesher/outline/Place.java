package tepor.mesher.outline;

/**
 * A place in a text file that a user wrote.
 *
 * @param file the file as the user named it
 * @param line line, counted from 1; 0 where no line is known
 * @param column column, counted from 1 in UTF-16 units; 0 where no column is known
 */
public record Place(String file, int line, int column) {
    @Override
    public String toString() {
        return line == 0 ? file : column == 0 ? file + ":" + line : file + ":" + line + ":" + column;
    }
}
