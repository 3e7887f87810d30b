package tepor.mesher.dxf;

import java.util.Map;
import tepor.mesher.outline.DrawingUnit;

/** The units of {@code $INSUNITS}. */
final class DxfUnits {
    private static final double INCH = 0.0254;
    private static final double FOOT = 0.3048;
    private static final double SURVEY_FOOT = 1200.0 / 3937;

    /** By number; 0 is "no unit". Lengths in metres as defined: the foot since 1959, the US survey foot since 1893. */
    static final Map<Integer, DrawingUnit> BY_NUMBER = Map.ofEntries(
            Map.entry(1, new DrawingUnit("in", INCH)),
            Map.entry(2, new DrawingUnit("ft", FOOT)),
            Map.entry(3, new DrawingUnit("mi", 5280 * FOOT)),
            Map.entry(4, new DrawingUnit("mm", 1e-3)),
            Map.entry(5, new DrawingUnit("cm", 1e-2)),
            Map.entry(6, new DrawingUnit("m", 1)),
            Map.entry(7, new DrawingUnit("km", 1e3)),
            Map.entry(8, new DrawingUnit("µin", 2.54e-8)),
            Map.entry(9, new DrawingUnit("mil", 2.54e-5)),
            Map.entry(10, new DrawingUnit("yd", 3 * FOOT)),
            Map.entry(11, new DrawingUnit("Å", 1e-10)),
            Map.entry(12, new DrawingUnit("nm", 1e-9)),
            Map.entry(13, new DrawingUnit("µm", 1e-6)),
            Map.entry(14, new DrawingUnit("dm", 0.1)),
            Map.entry(15, new DrawingUnit("dam", 10)),
            Map.entry(16, new DrawingUnit("hm", 100)),
            Map.entry(21, new DrawingUnit("survey ft", SURVEY_FOOT)),
            Map.entry(22, new DrawingUnit("survey in", SURVEY_FOOT / 12)),
            Map.entry(23, new DrawingUnit("survey yd", 3 * SURVEY_FOOT)),
            Map.entry(24, new DrawingUnit("survey mi", 5280 * SURVEY_FOOT)));

    private DxfUnits() {}
}
