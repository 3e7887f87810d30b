package tepor.mesher.outline;

import java.util.List;

/**
 * A drawing as it was read: named regions, lines and points, each with its place in the file.
 *
 * @param elements in the order of the file
 * @param unit the unit in which the file gives its coordinates (the elements are in metres)
 */
public record Outline(List<OutlineElement> elements, DrawingUnit unit) {
    public Outline {
        elements = List.copyOf(elements);
    }

    /** The elements of this name and kind, in the order of the file; empty where there is none. */
    public List<OutlineElement> find(String name, OutlineElement.Kind kind) {
        return elements.stream()
                .filter(e -> e.kind() == kind && e.name().equals(name))
                .toList();
    }
}
