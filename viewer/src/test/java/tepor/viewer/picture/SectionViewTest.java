package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Rectangle2D;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumSet;
import org.junit.jupiter.api.Test;
import tepor.mesher.section.Section;
import tepor.viewer.export.PngWriter;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.SegmentChains.Chain;

class SectionViewTest {
    private static final Path PICTURES = Path.of("target", "pictures");

    private static PatternedGrid grid() {
        return PatternedGrid.ring(0.05, 0.1, 12, 2).rounded();
    }

    @Test
    void arcsAreDrawnWithinATwentiethOfAPixel() {
        Section section = grid().section();
        SectionView view = new SectionView(section, new Rectangle2D.Double(100, 50, 1000, 1000), 1);
        assertThat(view.scale()).isCloseTo(5000, within(1e-9));
        int loops = 0;
        for (Chain chain : SegmentChains.loops(section, region -> region == 0)) {
            double[] px = view.points(chain);
            assertThat(chain.closed()).isTrue();
            assertThat(px.length).isGreaterThan(200);
            for (int i = 0; i < px.length; i += 2) {
                int j = (i + 2) % px.length;
                double at = Math.hypot(px[i] - 600, px[i + 1] - 550);
                double between = Math.hypot(0.5 * (px[i] + px[j]) - 600, 0.5 * (px[i + 1] + px[j + 1]) - 550);
                double radius = at < 375 ? 250 : 500;
                assertThat(at).isCloseTo(radius, within(1e-9));
                assertThat(between).isCloseTo(radius, within(0.0501));
            }
            loops++;
        }
        assertThat(loops).isEqualTo(2);
        assertThat(view.x(view.metresX(123.4))).isCloseTo(123.4, within(1e-9));
        assertThat(view.y(view.metresY(432.1))).isCloseTo(432.1, within(1e-9));
    }

    /** To be looked at: nothing angular on a ring of twelve coarse arcs. */
    @Test
    void picturesOfARoundRing() throws Exception {
        Files.createDirectories(PICTURES);
        SampleAnswers ring = new SampleAnswers("Round ring of twelve arcs", grid())
                .edge("bore", (x, y) -> Math.hypot(x, y) < 0.06)
                .insulated((x, y) -> Math.hypot(x, y) > 0.06 && x > 0.03)
                .peak("hottest", 80, 0.1, Double.NaN, null, 0.05, 0);
        Path field = PICTURES.resolve("round-ring.png");
        PngWriter.write(
                new IsothermPicture(
                        ring.answer(6, (x, y) -> 80 - 60 * Math.log(Math.hypot(x, y) / 0.05) / Math.log(2)),
                        new PictureOptions(1600, 0, EnumSet.allOf(Layer.class))),
                field);
        Path outline = PICTURES.resolve("round-outline.png");
        PngWriter.write(new OutlinePicture(ring.inspection(), PictureOptions.standard()), outline);
        assertThat(Files.size(field)).isGreaterThan(20_000);
        assertThat(Files.size(outline)).isGreaterThan(20_000);
    }
}
