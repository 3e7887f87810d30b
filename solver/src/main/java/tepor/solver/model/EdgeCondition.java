package tepor.solver.model;

/** One thing that holds on an edge of the boundary. An edge has one temperature, or any sum of the others. */
public sealed interface EdgeCondition {
    /** The word by which ledger and messages call it. */
    String word();

    /** A fixed temperature, kelvin. */
    record FixedTemperature(Input temperature) implements EdgeCondition {
        @Override
        public String word() {
            return "temperature";
        }
    }

    /**
     * Heat exchange with an air through a film.
     *
     * @param coefficient W/(m²·K)
     * @param airTemperature kelvin
     * @param air the air where it is a named one, else null
     */
    record Film(Input coefficient, Input airTemperature, Air air) implements EdgeCondition {
        @Override
        public String word() {
            return "film";
        }
    }

    /**
     * Heat exchange with an air through a surface resistance: a film of 1/R.
     *
     * @param resistance m²·K/W
     * @param airTemperature kelvin
     * @param air the air where it is a named one, else null
     */
    record SurfaceResistance(Input resistance, Input airTemperature, Air air) implements EdgeCondition {
        @Override
        public String word() {
            return "resistance";
        }
    }

    /**
     * A stated heat flow into the section.
     *
     * @param amount in the unit of the basis
     * @param basis to what it refers
     */
    record Inflow(Input amount, InflowBasis basis) implements EdgeCondition {
        @Override
        public String word() {
            return "inflow";
        }
    }

    /** To what an inflow refers. */
    enum InflowBasis {
        /** W/m². */
        PER_AREA,
        /** W/m: the whole edge, per metre of depth. */
        PER_LENGTH
    }
}
