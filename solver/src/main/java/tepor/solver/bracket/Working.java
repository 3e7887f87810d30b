package tepor.solver.bracket;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tepor.mesher.outline.DrawingUnit;
import tepor.solver.model.Case;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Units;

/** Writes out how a bound was reckoned, so that a checker can follow it with a pocket calculator. */
final class Working {
    private static final int MOST_LINES = 12;

    private final Case subject;
    private final Surroundings surroundings;

    Working(Case subject, Surroundings surroundings) {
        this.subject = subject;
        this.surroundings = surroundings;
    }

    /** Strips alike in their layers, wherever they stand. */
    private static final class Group {
        final List<double[]> spans = new ArrayList<>();
        double width;
        double conductance;
    }

    List<String> of(DrawingUnit unit, StripBound bound) {
        Frame frame = bound.frame();
        Map<String, Group> groups = new LinkedHashMap<>();
        for (StripBound.Strip strip : bound.strips) {
            Group group = groups.computeIfAbsent(layers(strip), key -> new Group());
            double from = frame.upright() ? strip.from() : -strip.to();
            double to = frame.upright() ? strip.to() : -strip.from();
            group.spans.add(new double[] {from, to});
            group.width += to - from;
            group.conductance += strip.conductance();
        }
        List<String> lines = new ArrayList<>();
        lines.add("lower: adiabatic cuts along " + frame.along() + " make strips side by side");
        List<String> sum = new ArrayList<>();
        int left = 0;
        double rest = 0;
        for (Map.Entry<String, Group> entry : groups.entrySet()) {
            Group group = entry.getValue();
            if (lines.size() > MOST_LINES) {
                left++;
                rest += group.conductance;
                continue;
            }
            lines.add("strip " + spans(unit, frame.across(), group.spans) + ": " + entry.getKey() + "; "
                    + length(group.width) + " wide: " + coupling(group.conductance));
            sum.add(number(group.conductance));
        }
        if (left > 0) {
            lines.add(left + " more kinds of strips: " + coupling(rest));
            sum.add(number(rest));
        }
        lines.add("side by side: " + total(sum) + coupling(bound.conductance()));
        return lines;
    }

    private String layers(StripBound.Strip strip) {
        if (Math.abs(strip.atTo() - strip.atFrom()) > 1e-9 * strip.atFrom()) {
            List<String> regions = new ArrayList<>();
            strip.layers().forEach(layer -> regions.add(name(layer.region())));
            return String.join(" + ", regions) + ", R between "
                    + resistance(Math.min(strip.atFrom(), strip.atTo())) + " and "
                    + resistance(Math.max(strip.atFrom(), strip.atTo()));
        }
        List<String> terms = new ArrayList<>();
        film(terms, strip.films()[0]);
        for (StripBound.Layer layer : strip.layers()) {
            terms.add(length(0.5 * (layer.atFrom() + layer.atTo())) + "/" + conductivity(layer.conductivity()) + " ("
                    + name(layer.region()) + ")");
        }
        film(terms, strip.films()[1]);
        return "R = " + String.join(" + ", terms) + " = " + resistance(strip.atFrom());
    }

    private static void film(List<String> terms, double film) {
        if (!Double.isInfinite(film)) {
            terms.add("1/" + Units.format(film, "W/(m2.K)", Dimension.FILM));
        }
    }

    List<String> of(DrawingUnit unit, PlaneBound bound) {
        Frame frame = bound.frame();
        List<String> lines = new ArrayList<>();
        lines.add("upper: perfectly conducting sheets across " + frame.along() + " make layers one after the other");
        List<String> sum = new ArrayList<>();
        surface(lines, sum, bound.first, bound.films[0]);
        Map<String, Group> groups = new LinkedHashMap<>();
        for (PlaneBound.Layer layer : bound.layers) {
            Group group = groups.computeIfAbsent(parts(layer), key -> new Group());
            group.spans.add(new double[] {layer.from(), layer.to()});
            group.width += layer.to() - layer.from();
            group.conductance += layer.resistance();
        }
        int left = 0;
        double rest = 0;
        for (Map.Entry<String, Group> entry : groups.entrySet()) {
            Group group = entry.getValue();
            if (lines.size() > MOST_LINES) {
                left++;
                rest += group.conductance;
                continue;
            }
            lines.add("layer " + spans(unit, frame.along(), group.spans) + ": " + length(group.width) + "/("
                    + entry.getKey() + ") = " + perLength(group.conductance));
            sum.add(number(group.conductance));
        }
        if (left > 0) {
            lines.add(left + " more kinds of layers: " + perLength(rest));
            sum.add(number(rest));
        }
        surface(lines, sum, 1 - bound.first, bound.films[1]);
        lines.add("one after the other: " + total(sum) + perLength(bound.resistance()) + "; the inverse: "
                + coupling(1 / bound.resistance()));
        return lines;
    }

    private String parts(PlaneBound.Layer layer) {
        List<String> terms = new ArrayList<>();
        for (PlaneBound.Part part : layer.regions()) {
            double low = Math.min(part.atFrom(), part.atTo());
            double high = Math.max(part.atFrom(), part.atTo());
            String width = high - low > 1e-9 * high ? number(low) + " to " + length(high) : length(low);
            terms.add(conductivity(part.conductivity()) + " × " + width + " " + name(part.region()));
        }
        return String.join(" + ", terms);
    }

    private void surface(List<String> lines, List<String> sum, int side, double film) {
        if (!Double.isInfinite(film)) {
            lines.add("surface to " + surroundings.name(side) + ": film times length is " + coupling(film)
                    + "; the inverse: " + perLength(1 / film));
            sum.add(number(1 / film));
        }
    }

    List<String> of(DrawingUnit unit, Polar polar, RayBound bound) {
        List<String> lines = new ArrayList<>();
        lines.add("lower: adiabatic cuts along the rays from " + unit.point(polar.centreX, polar.centreY));
        lines.add("rays over " + number(Math.toDegrees(bound.angle()))
                + " deg: R = Σ ln(r2/r1)/k + Σ 1/(h r), for one radian between " + perLength(bound.leastResistance())
                + " and " + perLength(bound.greatestResistance()));
        lines.add("side by side, ∫ d(angle)/R: " + coupling(bound.conductance()));
        return lines;
    }

    List<String> of(DrawingUnit unit, Polar polar, CircleBound bound) {
        List<String> lines = new ArrayList<>();
        lines.add("upper: perfectly conducting sheets on circles about " + unit.point(polar.centreX, polar.centreY));
        List<String> sum = new ArrayList<>();
        surface(lines, sum, bound.inner, bound.films[0]);
        int left = 0;
        double rest = 0;
        for (CircleBound.Ring ring : bound.rings) {
            if (ring.region() < 0 || lines.size() > MOST_LINES) {
                left++;
                rest += ring.resistance();
                continue;
            }
            String from = unit.length(ring.from());
            String to = unit.length(ring.to());
            lines.add("ring " + from + " to " + to + ": ln(" + to + " / " + from + ")/(2π k of " + name(ring.region())
                    + ") = " + perLength(ring.resistance()));
            sum.add(number(ring.resistance()));
        }
        if (left > 0) {
            lines.add("rings across several regions, ∫ dr/(r ∫ k d(angle)): " + perLength(rest));
            sum.add(number(rest));
        }
        surface(lines, sum, 1 - bound.inner, bound.films[1]);
        lines.add("one after the other: " + total(sum) + perLength(bound.resistance()) + "; the inverse: "
                + coupling(1 / bound.resistance()));
        return lines;
    }

    /** Coordinates of spans in their order, joined where they touch. */
    private static String spans(DrawingUnit unit, String coordinate, List<double[]> spans) {
        spans.sort(Comparator.comparingDouble(span -> span[0]));
        List<double[]> joined = new ArrayList<>();
        for (double[] span : spans) {
            double[] last = joined.isEmpty() ? null : joined.get(joined.size() - 1);
            if (last != null && last[1] == span[0]) {
                last[1] = span[1];
            } else {
                joined.add(span.clone());
            }
        }
        List<String> words = new ArrayList<>();
        for (double[] span : joined.subList(0, Math.min(joined.size(), MOST_LINES))) {
            words.add(unit.length(span[0]).replace(" " + unit.symbol(), "") + " to " + unit.length(span[1]));
        }
        String more = joined.size() > MOST_LINES ? " and " + (joined.size() - MOST_LINES) + " more" : "";
        return coordinate + " = " + String.join(", ", words) + more;
    }

    private static String total(List<String> terms) {
        return terms.size() < 2 || terms.size() > MOST_LINES ? "" : String.join(" + ", terms) + " = ";
    }

    private String name(int region) {
        return subject.regions().get(region).name();
    }

    private static String number(double value) {
        return Units.format(value, "", Dimension.NUMBER);
    }

    private static String length(double metres) {
        return Units.format(metres, "m", Dimension.LENGTH);
    }

    private static String conductivity(double k) {
        return Units.format(k, "W/(m.K)", Dimension.CONDUCTIVITY);
    }

    private static String coupling(double conductance) {
        return Units.format(conductance, "W/(m.K)", Dimension.COUPLING);
    }

    private static String resistance(double resistance) {
        return Units.format(resistance, "m2.K/W", Dimension.RESISTANCE);
    }

    private static String perLength(double resistance) {
        return number(resistance) + " m.K/W";
    }
}
