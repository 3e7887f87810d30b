package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.mending.Change;
import tepor.mesher.mending.MendedOutline;
import tepor.mesher.outline.Finding;
import tepor.mesher.section.RegionShape;

class DrawnCaseReaderTest {
    @TempDir
    Path folder;

    private DrawnCase read(String toml, String wkt) throws IOException {
        Files.writeString(folder.resolve("duct.wkt"), wkt);
        return DrawnCaseReader.read(Files.writeString(folder.resolve("duct.toml"), toml));
    }

    @Test
    void readsOutlinesWhateverElseIsWrong() throws IOException {
        DrawnCase drawn = read("""
                format = 1
                heat = "nonsense"
                [outline]
                unit = "mm"
                file = "duct.wkt"
                snap = "0.01 mm"
                [[region]]
                name = "duct"
                material = "unknown"
                [[region]]
                name = "void"
                material = "nothing"
                outline = "POLYGON ((1 1, 3 3, 3 1, 1 3, 1 1))"
                """, """
                # a ring that misses its beginning by a hair
                duct: POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0.000001))
                mark: POINT (5 5)
                spare: POLYGON ((0 0, 1 0, 1 1, 0 0))
                """);
        assertThat(drawn.regions()).extracting(RegionShape::name).containsExactly("duct", "void");
        assertThat(drawn.regions()).extracting(RegionShape::hole).containsExactly(false, true);
        assertThat(drawn.others()).extracting(e -> e.name()).containsExactly("mark", "spare");
        assertThat(drawn.snap()).isEqualTo(1e-5);
        assertThat(drawn.inline()).isTrue();
        assertThat(drawn.files()).hasSize(2);
        assertThat(drawn.findings()).extracting(Finding::code).containsExactly("ring-nearly-closed");
        MendedOutline mended = drawn.mended();
        assertThat(mended.changes()).extracting(Change::code).containsExactly("mended-self-crossing");
        assertThat(mended.shapes().get(1).polygons().getNumGeometries()).isEqualTo(2);
    }
}
