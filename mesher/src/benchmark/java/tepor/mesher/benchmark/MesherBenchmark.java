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
 * Times the mesher on one outline at several sizes.
 *
 * <p>Arguments: a file of well-known text, the smallest angle in degrees, the number of runs, whether the size is {@code even}
 * or {@code graded} (growing by half from left to right), and the sizes: longest sides in the outline's unit. Prints one line
 * for each size with the least time of all runs; the first size also warms the machine up.
 */
public final class MesherBenchmark {
    private static final int TRIANGLES_AT_MOST = 20_000_000;

    private MesherBenchmark() {}

    public static void main(String[] arguments) throws IOException {
        if (arguments.length < 5) {
            System.err.println("arguments: FILE.wkt ANGLE RUNS even|graded SIZE...");
            System.exit(2);
        }
        Section section = section(Path.of(arguments[0]));
        double angle = Math.toRadians(Double.parseDouble(arguments[1]));
        int runs = Integer.parseInt(arguments[2]);
        for (int i = 4; i < arguments.length; i++) {
            double size = Double.parseDouble(arguments[i]);
            SizeField field = arguments[3].equals("even") ? SizeField.even(size) : graded(section, size);
            run(section, new MeshOptions(angle, field, TRIANGLES_AT_MOST, 3), runs, size);
        }
    }

    private static SizeField graded(Section section, double size) {
        double[] box = section.bounds();
        return (x, y) -> size * (1 + 0.5 * (x - box[0]) / (box[2] - box[0]));
    }

    private static Section section(Path file) throws IOException {
        Findings findings = new Findings();
        Outline outline =
                WktReader.read(file.toString(), Files.readString(file), new DrawingUnit("m", 1), findings);
        findings.throwIfFaulty();
        List<RegionShape> shapes = new ArrayList<>();
        outline.elements()
                .forEach(e -> shapes.add(new RegionShape("region " + shapes.size(), e.shape(), false, e.place())));
        return SectionBuilder.build(shapes, List.of(), List.of(), Double.NaN, outline.unit(), findings)
                .orElseThrow(() -> new IllegalArgumentException(findings.all().toString()));
    }

    private static void run(Section section, MeshOptions options, int runs, double size) {
        double least = Double.POSITIVE_INFINITY;
        MeshResult result = null;
        for (int i = 0; i < runs; i++) {
            result = null;
            System.gc();
            long start = System.nanoTime();
            result = Mesher.mesh(section, options, () -> false);
            least = Math.min(least, 1e-9 * (System.nanoTime() - start));
        }
        int triangles = result.mesh().triangleCount();
        StringBuilder refused = new StringBuilder();
        for (RefinementReport.Reason reason : RefinementReport.Reason.values()) {
            refused.append(' ').append(result.report().count(reason));
        }
        System.out.printf(
                Locale.ROOT,
                "h=%-9.6g triangles=%-8d seconds=%-8.4f ktri_per_s=%-6.0f angle_made_deg=%.3f refused=%s%n",
                size,
                triangles,
                least,
                1e-3 * triangles / least,
                Math.toDegrees(result.quality().smallestAngleMade()),
                refused);
    }
}
