package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Rectangle2D;
import java.util.List;
import org.junit.jupiter.api.Test;
import tepor.mesher.section.Section;

class CloseUpTest {
    private static final Section SOIL =
            PatternedGrid.rectangle(20, 12, 10, 6, (i, j) -> 0, "soil").section();
    private static final SectionView VIEW = new SectionView(SOIL, new Rectangle2D.Double(100, 100, 1400, 840), 1);

    @Test
    void enlargesWhereAsksCrowdInALargeSection() {
        List<double[]> cables = List.of(new double[] {9, 11}, new double[] {9.2, 11}, new double[] {9.5, 11.1});
        CloseUp closeUp = CloseUp.of(VIEW, cables, 1);
        assertThat(closeUp.frame().intersects(closeUp.source(VIEW))).isFalse();
        assertThat(VIEW.box().contains(closeUp.frame())).isTrue();
        SectionView near = new SectionView(SOIL, closeUp.window(), closeUp.frame(), 1);
        assertThat(near.scale()).isGreaterThan(5 * VIEW.scale());
        for (double[] cable : cables) {
            assertThat(closeUp.frame().contains(near.x(cable[0]), near.y(cable[1])))
                    .isTrue();
        }
        assertThat(near.y(11) - near.y(11.1)).isCloseTo(0.1 * near.scale(), within(1e-9));
    }

    @Test
    void leavesOutWhatNeedsNoEnlargement() {
        assertThat(CloseUp.of(VIEW, List.of(), 1)).isNull();
        assertThat(CloseUp.of(VIEW, List.of(new double[] {9, 11}), 1))
                .as("a single place")
                .isNull();
        assertThat(CloseUp.of(VIEW, List.of(new double[] {9, 11}, new double[] {9, 11}), 1))
                .as("two asks at one place")
                .isNull();
        assertThat(CloseUp.of(VIEW, List.of(new double[] {4, 3}, new double[] {16, 9}), 1))
                .as("far apart")
                .isNull();
        assertThat(CloseUp.of(VIEW, List.of(new double[] {4, 3}, new double[] {4.2, 3}, new double[] {16, 9}), 1))
                .as("spread over the section, two of them near each other")
                .isNull();
    }
}
