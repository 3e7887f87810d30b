package tepor.solver.model;

import java.util.Arrays;

/** One value for each input of a case, SI. Immutable. The model holds inputs; what is computed, is computed for values. */
public final class Values {
    private final double[] value;

    /** @param value SI, one for each input by its index */
    public Values(double[] value) {
        this.value = value.clone();
    }

    /** Value of an input, SI. */
    public double of(Input input) {
        return value[input.index()];
    }

    /** The same values but for one input. */
    public Values with(Input input, double newValue) {
        double[] changed = value.clone();
        changed[input.index()] = newValue;
        return new Values(changed);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Values values && Arrays.equals(value, values.value);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(value);
    }
}
