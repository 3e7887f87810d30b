package tepor.solver.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Random;
import org.junit.jupiter.api.Test;

class SparsityPatternTest {
    /** Two triangles on a square of nodes 0 to 3 that share the side 0–2, node 3's value given: three unknowns. */
    private static final int[] SQUARE = {0, 1, 2, 0, 2, -1};

    @Test
    void holdsTheCouplingsOfTheElementsAndNoOthers() {
        SparsityPattern pattern = new SparsityPattern(4, 3, new int[] {0, 1, 2, 1, 3, -1});
        assertThat(pattern.slotCount()).isEqualTo(12);
        assertThat(pattern.rowStart()).containsExactly(0, 3, 7, 10, 12);
        assertThat(pattern.column()).containsExactly(0, 1, 2, 0, 1, 2, 3, 0, 1, 2, 1, 3);
        assertThat(pattern.slot(1, 3)).isEqualTo(6);
        assertThat(pattern.slot(0, 3)).isEqualTo(-1);
    }

    @Test
    void elementSlotsAreThoseThatTheSearchFinds() {
        ModelProblem problem = ModelProblem.fixedEnds(6, true, ModelProblem.constant(1));
        SparsityPattern pattern = problem.pattern;
        for (int row = 0; row < pattern.unknowns(); row++) {
            for (int slot = pattern.rowStart()[row]; slot < pattern.rowStart()[row + 1]; slot++) {
                assertThat(pattern.slot(row, pattern.column()[slot])).isEqualTo(slot);
                assertThat(slot == pattern.rowStart()[row] || pattern.column()[slot - 1] < pattern.column()[slot])
                        .as("columns ascend in row %s", row)
                        .isTrue();
            }
        }
        SparsityPattern square = new SparsityPattern(3, 3, SQUARE);
        for (int e = 0; e < 2; e++) {
            for (int i = 0; i < 3; i++) {
                for (int j = 0; j < 3; j++) {
                    int row = SQUARE[3 * e + i];
                    int column = SQUARE[3 * e + j];
                    assertThat(square.elementSlot(e, i, j))
                            .isEqualTo(row < 0 || column < 0 ? -1 : square.slot(row, column));
                }
            }
        }
    }

    @Test
    void assemblyAddsUpWhereElementsShareASide() {
        SparsityPattern pattern = new SparsityPattern(3, 3, SQUARE);
        double[] value = new double[pattern.slotCount()];
        double[] element = {11, 12, 13, 21, 22, 23, 31, 32, 33};
        pattern.add(0, element, value);
        pattern.add(1, element, value);
        assertThat(value).containsExactly(11 + 11, 12, 13 + 12, 21, 22, 23, 31 + 21, 32, 33 + 22);
    }

    @Test
    void anElementThatNamesAnUnknownTwiceAddsBothToIt() {
        SparsityPattern pattern = new SparsityPattern(2, 3, new int[] {0, 1, 1});
        double[] value = new double[pattern.slotCount()];
        pattern.add(0, new double[] {1, 2, 4, 8, 16, 32, 64, 128, 256}, value);
        assertThat(value).containsExactly(1, 2 + 4, 8 + 64, 16 + 32 + 128 + 256);
    }

    @Test
    void unknownsInNoElementHaveTheirDiagonal() {
        SparsityPattern pattern = new SparsityPattern(3, 2, new int[] {0, 2});
        assertThat(pattern.column()).containsExactly(0, 2, 1, 0, 2);
    }

    @Test
    void aPatternUsedTwiceGivesTheBitsOfAPatternMadeAnew() {
        ModelProblem first = ModelProblem.linear(10, ModelProblem.inclusions());
        Random random = new Random(3);
        double[] element = random.doubles(9).toArray();
        double[] reused = new double[first.pattern.slotCount()];
        double[] anew = new double[first.pattern.slotCount()];
        SparsityPattern again = ModelProblem.linear(10, ModelProblem.constant(1)).pattern;
        for (int e = 0; e < 200; e++) {
            first.pattern.add(e, element, reused);
            again.add(e, element, anew);
        }
        assertThat(reused).containsExactly(anew);
    }

    @Test
    void refusesWhatIsNoWholeElementOrOutOfRange() {
        assertThatThrownBy(() -> new SparsityPattern(3, 3, new int[] {0, 1}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("2 entries");
        assertThatThrownBy(() -> new SparsityPattern(3, 3, new int[] {0, 1, 2, 0, 1, 3}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("element 1 names unknown 3");
        assertThatThrownBy(() -> new SparsityPattern(3, 3, new int[] {0, 1, -2}))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("element 0 names unknown -2");
        assertThatThrownBy(() -> new SparsityPattern(3, 3, SQUARE).slot(0, 3))
                .isInstanceOf(IndexOutOfBoundsException.class);
    }
}
