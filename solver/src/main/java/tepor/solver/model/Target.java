package tepor.solver.model;

/** What an ask looks at. */
public sealed interface Target {
    /** Its name for people. */
    String name();

    /** The whole section. */
    record Everything() implements Target {
        @Override
        public String name() {
            return "everything";
        }
    }

    /** A region. */
    record OfRegion(Region region) implements Target {
        @Override
        public String name() {
            return region.name();
        }
    }

    /** An edge. */
    record OfEdge(Edge edge) implements Target {
        @Override
        public String name() {
            return edge.name();
        }
    }

    /** An air, by all its edges (flows only). */
    record OfAir(Air air) implements Target {
        @Override
        public String name() {
            return air.name();
        }
    }
}
