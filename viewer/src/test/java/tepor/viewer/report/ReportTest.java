package tepor.viewer.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.xpath.XPathFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import tepor.viewer.BusbarSample;
import tepor.viewer.export.PictureFile;

class ReportTest {
    private static final PictureFile PICTURE =
            new PictureFile("image/png", "Isotherms of \"a\" & <b>", new byte[] {1, 2, 3});

    private static String html(BusbarSample sample) throws Exception {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        Report.write(sample.answer(), List.of(PICTURE), out);
        return out.toString(StandardCharsets.UTF_8);
    }

    private static Document parse(String html) throws Exception {
        return DocumentBuilderFactory.newDefaultInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(html.getBytes(StandardCharsets.UTF_8)));
    }

    private static String at(Document page, String path) throws Exception {
        return XPathFactory.newDefaultInstance().newXPath().evaluate(path, page);
    }

    @Test
    void isAWellFormedPageThatNamesNoOtherFile() throws Exception {
        String html = html(new BusbarSample());
        Document page = parse(html);
        assertThat(html).startsWith("<!DOCTYPE html>");
        assertThat(at(page, "count(//script) + count(//link) + count(//iframe)"))
                .isEqualTo("0");
        assertThat(at(page, "//img/@src")).isEqualTo("data:image/png;base64,AQID");
        assertThat(at(page, "//img/@alt")).isEqualTo("Isotherms of \"a\" & <b>");
        assertThat(at(page, "count(//*[@src or @href]) = count(//img)")).isEqualTo("true");
        assertThat(at(page, "/html/@lang")).isEqualTo("en");
        assertThat(at(page, "count(//h1)")).isEqualTo("1");
        assertThat(at(page, "count(//th[not(@scope)])")).isEqualTo("0");
    }

    @Test
    void whatTheUserWroteNeverBecomesMarkup() throws Exception {
        String title = "<script>alert('x')</script> & \"quotes\" \u0001 ]]> <!-- € 𝛌";
        Document page = parse(html(new BusbarSample().title(title)));
        assertThat(at(page, "count(//script)")).isEqualTo("0");
        assertThat(at(page, "//h1")).isEqualTo(title.replace('\u0001', '\ufffd'));
        assertThat(at(page, "/html/head/title")).isEqualTo(title.replace('\u0001', '\ufffd'));
        assertThat(at(page, "//section[h2='Warnings']//li")).startsWith("2 inputs state a spread <b>; nothing to do");
    }

    @Test
    void holdsWhatACheckerNeeds() throws Exception {
        Document page = parse(html(new BusbarSample()));
        String answer = at(page, "//section[h2='Answers']//tbody/tr[1]");
        assertThat(answer).contains("hottest bar", "96.370\u00a0°C", "± 0.050", "estimate, within 0.2", "≤ 105 °C");
        assertThat(answer).contains("met, by 8.630 K; 6 inputs taken as exact", "at (100 60) mm");
        assertThat(at(page, "//section[h2='Answers']//tbody/tr[2]")).contains("42.000\u00a0W/m", "105 W for 2.5 m");
        assertThat(at(page, "//section[h2='Hand check']")).contains("flow < 43.5 W/m", "inside.");
        assertThat(at(page, "//section[h2='Where the heat comes from and goes to']//tbody/tr[3]/td[2]"))
                .isEqualTo("42");
        assertThat(at(page, "//section[h2='Insulated boundary']")).contains("440 mm from (0 120) mm");
        assertThat(at(page, "//section[h2='Inputs']"))
                .contains("air.room.film", "± 1.6\u00a0W/(m²·K), rectangular", "normal, k = 2")
                .contains("supplier's data sheet, nominal", "does not count them");
        assertThat(at(page, "//section[h2='Mesh and solution']//tbody/tr[1]")).contains("95.900", "96.370");
        assertThat(at(page, "//section[h2='What this calculation leaves out']"))
                .contains("burns", "fire", "mould", "licensed engineer", "local codes");
        assertThat(at(page, "//section[h2='Versions and files']"))
                .contains(BusbarSample.FIRST_DIGEST, BusbarSample.SECOND_DIGEST, "duct.wkt");
        assertThat(at(page, "//table[@class='signatures']")).contains("Prepared", "A. Nobody", "Checked", "Approved");
    }
}
