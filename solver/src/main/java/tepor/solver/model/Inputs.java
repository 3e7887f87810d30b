package tepor.solver.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tepor.mesher.outline.Place;
import tepor.solver.quantity.Quantity;

/** All inputs of a case in the order in which they were read. Filled while a case is read, then left alone. */
public final class Inputs {
    private final List<Input> list = new ArrayList<>();

    /**
     * Adds an input.
     *
     * @throws IllegalArgumentException if there is an input of this path already
     */
    public Input add(String path, Quantity quantity, Place place) {
        if (find(path).isPresent()) {
            throw new IllegalArgumentException("there is an input " + path + " already");
        }
        Input input = new Input(list.size(), path, quantity, place);
        list.add(input);
        return input;
    }

    public List<Input> all() {
        return List.copyOf(list);
    }

    public Optional<Input> find(String path) {
        return list.stream().filter(i -> i.path().equals(path)).findFirst();
    }

    /** The values as stated. */
    public Values nominal() {
        return new Values(list.stream().mapToDouble(i -> i.quantity().value()).toArray());
    }
}
