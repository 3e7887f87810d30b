package tepor.solver.casefile;

import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.section.EdgeFinder;
import tepor.mesher.section.EdgePieces;
import tepor.mesher.section.Section;
import tepor.mesher.section.Where;
import tepor.solver.casefile.EdgeReader.WrittenEdge;
import tepor.solver.model.Edge;

/** Finds the edges on the section, and refuses conditions where none can hold. */
final class EdgePlacer {
    private final Section section;
    private final DrawingUnit unit;
    private final Findings findings;
    private final EdgeFinder finder;

    EdgePlacer(Section section, DrawingUnit unit, Findings findings) {
        this.section = section;
        this.unit = unit;
        this.findings = findings;
        this.finder = new EdgeFinder(section);
    }

    /** The edges by name, in the order written; those with a fault are left out. */
    Map<String, Edge> place(List<WrittenEdge> written) {
        EdgePieces[] found = find(written);
        for (int i = 0; i < found.length; i++) {
            if (found[i] != null) {
                checkFound(written.get(i), found[i]);
                checkBoundary(written.get(i), found[i]);
            }
        }
        checkOverlaps(written, found);
        Map<String, Edge> edges = new LinkedHashMap<>();
        for (int i = 0; i < found.length; i++) {
            WrittenEdge edge = written.get(i);
            EdgePieces pieces = found[i];
            if (pieces != null && !pieces.isEmpty()) {
                edge.conditions()
                        .ifPresent(conditions -> edges.putIfAbsent(
                                edge.name(),
                                new Edge(
                                        edge.name(),
                                        pieces,
                                        conditions,
                                        edge.insulated(),
                                        edge.table().place())));
            }
        }
        return edges;
    }

    /** One entry for each edge; null where it is not known where the edge is. */
    private EdgePieces[] find(List<WrittenEdge> written) {
        EdgePieces[] found = new EdgePieces[written.size()];
        BitSet conditioned = new BitSet();
        // The rest is what others leave: first the edges that say where they are, then a rest with a condition, then
        // mere names of what is left.
        for (Turn turn : Turn.values()) {
            BitSet before = (BitSet) conditioned.clone();
            int restWithCondition = -1;
            for (int i = 0; i < found.length; i++) {
                WrittenEdge edge = written.get(i);
                if (edge.where().isEmpty() || Turn.of(edge) != turn) {
                    continue;
                }
                if (turn == Turn.REST_WITH_CONDITION && restWithCondition >= 0) {
                    twoRests(written.get(restWithCondition), edge);
                    continue;
                }
                found[i] = finder.find(edge.where().get(), before);
                warnOfEmptyParts(edge, before, found[i]);
                if (edge.statesCondition()) {
                    restWithCondition = i;
                    for (int s : found[i].segments()) {
                        conditioned.set(s);
                    }
                }
            }
        }
        return found;
    }

    /** In which order edges are found. */
    private enum Turn {
        STATED_PLACE,
        REST_WITH_CONDITION,
        REST_AS_NAME;

        static Turn of(WrittenEdge edge) {
            Where where = edge.where().orElseThrow();
            boolean rest = where instanceof Where.Rest
                    || where instanceof Where.Union union
                            && union.parts().stream().anyMatch(p -> p instanceof Where.Rest);
            return !rest ? STATED_PLACE : edge.statesCondition() ? REST_WITH_CONDITION : REST_AS_NAME;
        }
    }

    private void twoRests(WrittenEdge first, WrittenEdge second) {
        findings.error(
                "two-rests",
                second.table().place("where"),
                "edges '" + first.name() + "' (" + first.table().place("where") + ") and '" + second.name()
                        + "' both state a condition on the rest",
                "say where one of them is");
    }

    private void warnOfEmptyParts(WrittenEdge edge, BitSet conditioned, EdgePieces whole) {
        if (whole.isEmpty() || !(edge.where().orElseThrow() instanceof Where.Union union)) {
            return;
        }
        for (int part = 0; part < union.parts().size(); part++) {
            if (finder.find(union.parts().get(part), conditioned).isEmpty()) {
                findings.warning(
                        "part-finds-nothing",
                        edge.table().place("where"),
                        "part " + (part + 1) + " of the where of "
                                + edge.table().label() + " finds nothing: "
                                + new WhereText(section, unit)
                                        .lookedFor(union.parts().get(part)),
                        "correct it, or leave it out");
            }
        }
    }

    private void checkFound(WrittenEdge edge, EdgePieces pieces) {
        if (pieces.isEmpty()) {
            WhereText text = new WhereText(section, unit);
            findings.error(
                    "edge-not-found",
                    edge.table().place("where"),
                    edge.table().label() + " finds nothing: "
                            + text.lookedFor(edge.where().orElseThrow()),
                    text.remedy(edge.where().orElseThrow()));
        }
    }

    private void checkBoundary(WrittenEdge edge, EdgePieces pieces) {
        if (!edge.statesCondition()) {
            return;
        }
        double length = 0;
        int longest = -1;
        for (int s : pieces.segments()) {
            if (!section.isBoundary(s)) {
                length += section.length(s);
                longest = longest < 0 || section.length(s) > section.length(longest) ? s : longest;
            }
        }
        if (longest < 0) {
            return;
        }
        if (section.isCut(longest)) {
            findings.error(
                    "condition-on-cut",
                    edge.table().place(edge.stated().get(0)),
                    edge.table().label() + " is a cut through region '" + section.regionName(section.left(longest))
                            + "', where " + edge.stated().get(0) + " cannot hold: a cut is for asks only",
                    "leave the condition out, or draw a border of regions there");
            return;
        }
        String between = "'" + section.regionName(section.left(longest)) + "' and '"
                + section.regionName(section.right(longest)) + "'";
        String where = edge.table().label() + " lies for " + unit.length(length) + " between regions, such as "
                + between + " at " + middle(longest);
        if (edge.stated().equals(List.of("inflow"))) {
            findings.error(
                    "not-in-this-version",
                    edge.table().place("inflow"),
                    where + "; an inflow there belongs to format 1, but this version does not do it yet",
                    "produce the heat in a thin region: heat = \"…\"");
            return;
        }
        findings.error(
                "condition-inside",
                edge.table().place(edge.stated().get(0)),
                where + ", where " + edge.stated().get(0) + " cannot hold: it holds on the boundary only",
                "make one of the regions of material \"nothing\" if there is none in truth, or keep the edge to the"
                        + " boundary");
    }

    private void checkOverlaps(List<WrittenEdge> written, EdgePieces[] found) {
        for (int i = 0; i < found.length; i++) {
            if (found[i] == null || !written.get(i).statesCondition()) {
                continue;
            }
            BitSet first = new BitSet();
            for (int s : found[i].segments()) {
                first.set(s);
            }
            for (int j = i + 1; j < found.length; j++) {
                if (found[j] != null && written.get(j).statesCondition()) {
                    overlap(written.get(i), first, written.get(j), found[j]);
                }
            }
        }
    }

    private void overlap(WrittenEdge first, BitSet firstSegments, WrittenEdge second, EdgePieces secondPieces) {
        double length = 0;
        int longest = -1;
        for (int s : secondPieces.segments()) {
            if (firstSegments.get(s)) {
                length += section.length(s);
                longest = longest < 0 || section.length(s) > section.length(longest) ? s : longest;
            }
        }
        if (longest >= 0) {
            findings.error(
                    "conditions-overlap",
                    second.table().place("where"),
                    "edges '" + first.name() + "' (" + first.table().place("where") + ") and '" + second.name()
                            + "' both state a condition on the same " + unit.length(length)
                            + " of boundary, such as from "
                            + point(section.start(longest)) + " to " + point(section.end(longest)),
                    "state each condition once: narrow the where of one of them");
        }
    }

    private String point(int vertex) {
        return unit.point(section.x(vertex), section.y(vertex));
    }

    private String middle(int segment) {
        int a = section.start(segment);
        int b = section.end(segment);
        return unit.point(0.5 * (section.x(a) + section.x(b)), 0.5 * (section.y(a) + section.y(b)));
    }

    /** Segments on which some edge states more than insulation, or which lie between regions: heat may pass there. */
    BitSet passable(Map<String, Edge> edges) {
        BitSet passable = new BitSet();
        for (int s = 0; s < section.segmentCount(); s++) {
            passable.set(s, section.solidLeft(s) && section.solidRight(s));
        }
        for (Edge edge : edges.values()) {
            if (!edge.conditions().isEmpty()) {
                for (int s : edge.pieces().segments()) {
                    passable.set(s);
                }
            }
        }
        return passable;
    }
}
