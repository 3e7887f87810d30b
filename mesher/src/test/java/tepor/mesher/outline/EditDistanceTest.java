package tepor.mesher.outline;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EditDistanceTest {
    @ParameterizedTest
    @CsvSource({
        "kitten, sitting, 3",
        "materail, material, 1",
        "POLYGN, POLYGON, 1",
        "film, film, 0",
        "K, k, 1",
        "'', air, 3",
        "air, '', 3"
    })
    void countsInsertedDeletedChangedAndSwappedLetters(String a, String b, int distance) {
        assertThat(EditDistance.between(a, b)).isEqualTo(distance);
        assertThat(EditDistance.between(b, a)).isEqualTo(distance);
    }
}
