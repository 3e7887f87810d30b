package tepor.solver.answer;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.IntPredicate;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleFinder;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.solver.assembly.FacetEffect;
import tepor.solver.assembly.FilmExchange;
import tepor.solver.assembly.Tensor;
import tepor.solver.field.Extreme;
import tepor.solver.field.ExtremeFinder;
import tepor.solver.field.FacetFlows;
import tepor.solver.field.FieldMean;
import tepor.solver.field.Solution;
import tepor.solver.field.TemperatureField;
import tepor.solver.model.Air;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.Region;
import tepor.solver.model.Target;
import tepor.solver.model.Values;

/** Evaluates asks on the solutions of one mesh. */
final class AskEvaluator {
    /** A tolerance on a temperature is never taken below this, K: a section at one temperature has no spread. */
    private static final double LEAST_SPREAD = 0.1;

    /** Share of the heat passing through to which a flow's tolerance refers at least. */
    private static final double LEAST_FLOW = 1e-3;

    private final CaseSolutions solutions;
    private final Case subject;
    private final Mesh mesh;
    private final TriangleFinder finder;
    private final Map<Ask, AskValue> known = new HashMap<>();

    AskEvaluator(CaseSolutions solutions) {
        this.solutions = solutions;
        subject = solutions.subject();
        mesh = solutions.mesh();
        finder = new TriangleFinder(mesh);
    }

    /** @throws FaultyInputException if the ask has no answer: a flow where two different fixed temperatures meet */
    AskValue evaluate(Ask ask) {
        AskValue value = known.get(ask);
        if (value == null) {
            value = compute(ask);
            known.put(ask, value);
        }
        return value;
    }

    private AskValue compute(Ask ask) {
        Values values = AskValues.of(subject, ask);
        if (ask instanceof Ask.Peak peak) {
            return extreme(peak.target(), values, true);
        }
        if (ask instanceof Ask.Lowest lowest) {
            return extreme(lowest.target(), values, false);
        }
        if (ask instanceof Ask.Mean mean) {
            return mean(mean.target(), values);
        }
        if (ask instanceof Ask.At at) {
            Solution solution = solutions.solution(values);
            double kelvin = solution.field().at(at.x(), at.y(), finder);
            return new AskValue(kelvin, new double[] {at.x(), at.y()}, spread(solution.field()));
        }
        if (ask instanceof Ask.Flow flow) {
            return flow(flow, values);
        }
        if (ask instanceof Ask.Coupling coupling) {
            return coupling(coupling.to(), values);
        }
        if (ask instanceof Ask.Transmittance transmittance) {
            AskValue coupling = coupling(transmittance.to(), values);
            double less = 0;
            for (Ask.Less part : transmittance.less()) {
                less += values.of(part.u()) * values.of(part.length());
            }
            return new AskValue(coupling.value() - less, null, Math.abs(coupling.value()));
        }
        if (ask instanceof Ask.Factor factor) {
            int[] facets = facets(factor.edge());
            Extreme coldest =
                    ExtremeFinder.overFacets(solutions.solution(values).field(), facets, false);
            double inner = values.of(factor.inner().temperature());
            double outer = values.of(factor.outer().temperature());
            if (inner == outer) {
                throw new FaultyInputException(List.of(new Finding(
                        Finding.Severity.ERROR,
                        "no-difference",
                        ask.head().place(),
                        "the temperature factor of '" + ask.name() + "' is not defined: '"
                                + factor.inner().name() + "' and '"
                                + factor.outer().name()
                                + "' have the same temperature",
                        "give the two airs different temperatures")));
            }
            return new AskValue(
                    (coldest.kelvin() - outer) / (inner - outer), new double[] {coldest.x(), coldest.y()}, 1);
        }
        Ask.Difference difference = (Ask.Difference) ask;
        AskValue first = evaluate(difference.first());
        AskValue second = evaluate(difference.second());
        return new AskValue(first.value() - second.value(), null, Math.max(first.reference(), second.reference()));
    }

    private AskValue extreme(Target target, Values values, boolean highest) {
        TemperatureField field = solutions.solution(values).field();
        Extreme extreme = target instanceof Target.OfEdge edge
                ? ExtremeFinder.overFacets(field, facets(edge.edge()), highest)
                : ExtremeFinder.overTriangles(field, triangles(target), highest);
        return new AskValue(extreme.kelvin(), new double[] {extreme.x(), extreme.y()}, spread(field));
    }

    private AskValue mean(Target target, Values values) {
        TemperatureField field = solutions.solution(values).field();
        double mean = target instanceof Target.OfEdge edge
                ? FieldMean.overFacets(field, facets(edge.edge()))
                : FieldMean.overTriangles(field, triangles(target));
        return new AskValue(mean, null, spread(field));
    }

    private IntPredicate triangles(Target target) {
        if (target instanceof Target.OfRegion region) {
            int number = region.region().index();
            return t -> mesh.region(t) == number;
        }
        return t -> true;
    }

    private int[] facets(Edge edge) {
        return solutions.index().on(edge.pieces().segments());
    }

    private double spread(TemperatureField field) {
        double high = ExtremeFinder.overTriangles(field, t -> true, true).kelvin();
        double low = ExtremeFinder.overTriangles(field, t -> true, false).kelvin();
        return Math.max(high - low, LEAST_SPREAD);
    }

    private AskValue flow(Ask.Flow ask, Values values) {
        double out = ask.target() instanceof Target.OfAir air
                ? intoAir(air.air(), values)
                : through(ask, ((Target.OfEdge) ask.target()).edge(), values);
        return flowValue(out, values);
    }

    private AskValue coupling(Air to, Values values) {
        return flowValue(intoAir(to, values), values);
    }

    private AskValue flowValue(double out, Values values) {
        double passing = LedgerBuilder.build(solutions, values).rows().stream()
                        .mapToDouble(row -> Math.abs(row.in()))
                        .sum()
                / 2;
        double reference = Math.max(Math.abs(out), LEAST_FLOW * passing);
        return new AskValue(out, null, Math.max(reference, roundOff(values)));
    }

    /** What rounding alone may make of a flow where nothing flows, W/m. */
    private double roundOff(Values values) {
        Solution solution = solutions.solution(values);
        double largest = 0;
        for (Region region : subject.regions()) {
            if (!region.isHole()) {
                Tensor k = solution.balance().conduction().tensor(region.index());
                largest = Math.max(largest, Math.max(k.xx(), k.yy()));
            }
        }
        return 1e-10 * largest * Math.abs(solution.field().at(0));
    }

    private double intoAir(Air air, Values values) {
        Solution solution = solutions.solution(values);
        double[] kelvin = solution.field().nodal();
        double out = 0;
        for (FacetEffect effect : solution.balance().facetEffects()) {
            if (effect instanceof FilmExchange film && film.airInput().equals(air.temperature())) {
                for (int f : film.facets()) {
                    out -= film.heatIn(kelvin, f);
                }
            }
        }
        return out;
    }

    private double through(Ask ask, Edge edge, Values values) {
        FacetFlows flows = solutions.flows(values);
        refuseMeetings(ask, edge, solutions.solution(values));
        double out = 0;
        int[] segments = edge.pieces().segments();
        for (int i = 0; i < segments.length; i++) {
            boolean fromLeft = edge.pieces().signs()[i] > 0;
            for (int f : solutions.index().on(segments[i])) {
                if (mesh.isBoundaryFacet(f)) {
                    out -= flows.intoSection(f);
                } else {
                    out -= fromLeft ? flows.intoLeft(f) : flows.intoRight(f);
                }
            }
        }
        return out;
    }

    /**
     * Where two different fixed temperatures meet, the heat turns about the node: the same flux, growing as the inverse of
     * the distance, through every line from it. The flow has a limit only where what is asked for crosses those lines as
     * often one way round as the other, as the whole border of a region does.
     */
    private void refuseMeetings(Ask ask, Edge edge, Solution solution) {
        Set<Integer> meetings = solution.balance().fixed().meetings().keySet();
        if (meetings.isEmpty()) {
            return;
        }
        Map<Integer, Integer> turns = new TreeMap<>();
        int[] segments = edge.pieces().segments();
        for (int i = 0; i < segments.length; i++) {
            for (int f : solutions.index().on(segments[i])) {
                for (int end = 0; end < 2; end++) {
                    int node = mesh.facetNode(f, end);
                    if (meetings.contains(node)) {
                        turns.merge(
                                node,
                                end == 0
                                        ? edge.pieces().signs()[i]
                                        : -edge.pieces().signs()[i],
                                Integer::sum);
                    }
                }
            }
        }
        turns.forEach((node, turn) -> {
            if (turn != 0) {
                throw new FaultyInputException(List.of(new Finding(
                        Finding.Severity.ERROR,
                        "endless-flow",
                        ask.head().place(),
                        "the heat flow through '" + edge.name()
                                + "' has no limit: two different fixed temperatures meet at "
                                + subject.unit().point(mesh.x(node), mesh.y(node)),
                        "leave a gap between the two, give one of them a film or resistance, or ask for temperatures"
                                + " only")));
            }
        });
    }
}
