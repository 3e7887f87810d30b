package tepor.mesher.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.mesh.Mesher;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Outline;
import tepor.mesher.outline.WktReader;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.refinement.SizeField;
import tepor.mesher.section.RegionShape;
import tepor.mesher.section.Section;
import tepor.mesher.section.SectionBuilder;

/**
 * Times the mesher: {@code MesherBenchmark FILE.wkt ANGLE RUNS SIZE...} meshes the outline at each size (the longest side,
 * in the outline's unit) and prints one line for each, with the least time of all runs.
 */
public final class MesherBenchmark {
    private MesherBenchmark() {}

    public static void main(String[] arguments) throws IOException {
        Section section = section(Path.of(arguments[0]));
        double angle = Math.toRadians(Double.parseDouble(arguments[1]));
        int runs = Integer.parseInt(arguments[2]);
        for (int i = 3; i < arguments.length; i++) {
            double size = Double.parseDouble(arguments[i]);
            run(section, angle, size, runs);
        }
    }

    private static Section section(Path file) throws IOException {
        Findings findings = new Findings();
        Outline outline = WktReader.read(
                file.toString(), Files.readString(file), new DrawingUnit("m", 1), findings);
        findings.throwIfFaulty();
        List<RegionShape> shapes = new ArrayList<>();
        outline.elements()
                .forEach(e -> shapes.add(new RegionShape("region " + shapes.size(), e.shape(), false, e.place())));
        return SectionBuilder.build(shapes, List.of(), Double.NaN, outline.unit(), findings)
                .orElseThrow(() -> new IllegalArgumentException(findings.toString()));
    }

    private static void run(Section section, double angle, double size, int runs) {
        double least = Double.POSITIVE_INFINITY;
        MeshResult result = null;
        for (int i = 0; i < runs; i++) {
            result = null;
            System.gc();
            long start = System.nanoTime();
            result = Mesher.mesh(section, new MeshOptions(angle, SizeField.even(size), 20_000_000, 3), () -> false);
            least = Math.min(least, 1e-9 * (System.nanoTime() - start));
        }
        int triangles = result.mesh().triangleCount();
        StringBuilder refused = new StringBuilder();
        for (RefinementReport.Reason reason : RefinementReport.Reason.values()) {
            refused.append(' ').append(result.report().count(reason));
        }
        System.out.printf(
                Locale.ROOT,
                "h=%-9.6g triangles=%-8d seconds=%-8.4f ktri_per_s=%-7.0f angle_made_deg=%.3f refused=%s%n",
                size,
                triangles,
                least,
                1e-3 * triangles / least,
                Math.toDegrees(result.quality().smallestAngleMade()),
                refused);
    }
}
