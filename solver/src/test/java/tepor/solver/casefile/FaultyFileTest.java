package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.solver.model.Case;

/** Files that cannot be read, and text that is no TOML. */
class FaultyFileTest {
    private static final String WITH_FILE = CaseFolder.sound("[outline]\n", "[outline]\nfile = \"duct.wkt\"\n")
            .replaceFirst("outline = \"[^\"]*\"\n", "");

    @TempDir
    Path temp;

    private List<Finding> found(Path file) {
        return catchThrowableOfType(FaultyInputException.class, () -> CaseReader.read(file))
                .findings();
    }

    private CaseFolder folder() {
        return new CaseFolder(temp);
    }

    @Test
    void aCaseFileThatIsNotThere() {
        Finding error = found(temp.resolve("none.toml")).get(0);
        assertThat(error.place()).hasToString(temp.resolve("none.toml").toString());
        assertThat(error.what()).contains("there is no file", "none.toml");
    }

    @Test
    void aFolderInsteadOfACaseFile() {
        assertThat(found(temp).get(0).what()).contains("is a folder");
    }

    @Test
    void aCaseFileThatIsNotUtf8() throws Exception {
        Files.write(
                temp.resolve("latin.toml"),
                "format = 1\ntitle = \"K\u00fchler\"\n".getBytes(StandardCharsets.ISO_8859_1));
        Finding error = found(temp.resolve("latin.toml")).get(0);
        assertThat(error.place().line()).isEqualTo(2);
        assertThat(error.what()).contains("not UTF-8", "0xfc");
        assertThat(error.remedy()).contains("UTF-8");
    }

    @Test
    void aByteOrderMarkAndWindowsLineEndsAreRead() {
        Case subject = folder().read("\uFEFF" + CaseFolder.SOUND.replace("\n", "\r\n"));
        assertThat(subject.title()).isEqualTo("Plate");
        assertThat(subject.regions()).hasSize(3);
    }

    @Test
    void allSyntaxErrorsAtOnce() {
        List<Finding> errors = folder().errors("format = 1\n«format = 1\ntitle = \"Plate«\n[mesh]\nsize = 5 «mm\n");
        assertThat(errors).allMatch(e -> e.code().equals("toml-syntax"));
        assertThat(errors.get(0).what()).contains("format", "previously defined at line 1");
        assertThat(errors.get(1).what()).contains("end of line");
        assertThat(errors.get(1).remedy()).contains("\"double quotes\"");
    }

    @Test
    void aTableThatStandsTwice() {
        Finding error =
                folder().errors(CaseFolder.SOUND + "«[outline]\nunit = \"m\"\n").get(0);
        assertThat(error.what()).contains("outline", "previously defined at line 3");
        assertThat(error.remedy()).contains("stands once");
    }

    @Test
    void aNulCharacter() {
        Finding error = folder().errors("format = 1\ntitle = \"a«\0\"\n[\0").get(0);
        assertThat(error.what()).contains("NUL");
    }

    @Test
    void anOutlineFileThatIsNotThere() {
        Finding error = folder().errors(WITH_FILE.replace("file = \"duct.wkt\"", "«file = \"dukt.wkt\""))
                .get(0);
        assertThat(error.code()).isEqualTo("file-missing");
        assertThat(error.what()).contains("dukt.wkt");
        assertThat(error.remedy()).contains("relative to the case file");
    }

    @Test
    void anOutlineFileOfAnotherKind() {
        Finding error = folder().errors(WITH_FILE.replace("file = \"duct.wkt\"", "«file = \"duct.svg\""))
                .get(0);
        assertThat(error.what()).contains("'duct.svg'", ".wkt", ".dxf");
    }

    @Test
    void faultsInTheOutlineFileHaveTheirPlaceThere() {
        folder().write("duct.wkt", "# mm\nplate: POLYGON ((0 0, 100 0, 100 x, 0 50, 0 0))\n");
        List<Finding> errors = folder().all(WITH_FILE);
        assertThat(errors).hasSize(1);
        assertThat(errors.get(0).place().file())
                .isEqualTo(folder().file("duct.wkt").toString());
        assertThat(errors.get(0).place().line()).isEqualTo(2);
    }

    @Test
    void aRecordWithoutItsRegionAndARegionWithoutItsRecord() {
        folder().write("duct.wkt", "plaet: POLYGON ((0 0, 100 0, 100 50, 0 50, 0 0))\n");
        List<Finding> found = folder().all(WITH_FILE);
        assertThat(found).hasSize(2);
        assertThat(found).anySatisfy(f -> {
            assertThat(f.code()).isEqualTo("unused-record");
            assertThat(f.severity()).isEqualTo(Finding.Severity.WARNING);
            assertThat(f.place().file()).endsWith("duct.wkt");
        });
        assertThat(found).anySatisfy(f -> {
            assertThat(f.code()).isEqualTo("outline-missing");
            assertThat(f.place().line()).isEqualTo(7);
            assertThat(f.what()).contains("region 'plate'", "duct.wkt");
            assertThat(f.remedy()).contains("'plaet'");
        });
    }

    @Test
    void aRecordThatIsALine() {
        folder().write("duct.wkt", "plate: LINESTRING (0 0, 100 0, 100 50)\n");
        assertThat(folder().all(WITH_FILE)).anySatisfy(f -> {
            assertThat(f.what()).contains("its record is a line");
            assertThat(f.remedy()).contains("POLYGON");
        });
    }

    @Test
    void recordsOfOneNameThatOverlap() {
        folder().write("duct.wkt", """
                        plate: POLYGON ((0 0, 100 0, 100 50, 0 50, 0 0))
                        plate: POLYGON ((90 0, 120 0, 120 50, 90 50, 90 0))
                        """);
        List<Finding> errors = folder().all(WITH_FILE);
        assertThat(errors).hasSize(1);
        assertThat(errors.get(0).what()).contains("'plate'", "overlap");
    }

    @Test
    void recordsOfOneNameThatMeetAreOneRegion() {
        folder().write("duct.wkt", """
                        plate: POLYGON ((0 0, 100 0, 100 50, 0 50, 0 0))
                        plate: MULTIPOLYGON (((100 0, 120 0, 120 50, 100 50, 100 0)))
                        """);
        Case subject = folder().read(WITH_FILE);
        assertThat(subject.section().area(0)).isCloseTo((120 * 50 - 800) * 1e-6, within(1e-12));
    }

    @Test
    void tenErrorsInOneCaseAreTenFindings() {
        List<Finding> errors = folder().errors("""
                        format = 1
                        «dept = "2 m"
                        [outline]
                        unit = "mm"
                        [[region]]
                        name = "plate"
                        «outline = "POLYGON ((0 0, 100 50, 100 0, 0 50, 0 0))"
                        «material = "steal"
                        [material.steel]
                        «k = 15
                        [material.copper]
                        «k = "380 W/(m.K"
                        [air.room]
                        «temperature = "20 kg"
                        «film = "-8 W/(m2.K)"
                        [[edge]]
                        name = "skin"
                        where = "top"
                        «air = "roam"
                        film = "8 W/(m2.K)"
                        «[[ask]]
                        name = "hot"
                        [mesh]
                        «angle = "60 deg"
                        """);
        assertThat(errors).hasSize(10);
    }

    @Test
    void singleBracketsAboveDoubleOnesAreOneFault() {
        String text = CaseFolder.SOUND.replaceFirst("\\[\\[region]]", "[region]");
        assertThat(text.split("\\[\\[region]]", -1)).hasSizeGreaterThan(1);
        int second = text.indexOf("[[region]]");
        List<Finding> errors = folder().errors(text.substring(0, second) + "«" + text.substring(second));
        assertThat(errors).hasSize(1);
        assertThat(errors.get(0).what()).contains("region", "previously defined at line");
        assertThat(errors.get(0).remedy()).contains("[[region]]");
    }
}
