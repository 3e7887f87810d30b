package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever is done to a sound file, reading it ends, throws nothing, and finds something or reads something. */
class DamagedDrawingTest {
    private static final String SOUND = DrawnDxf.file(
            "LAYER;2 a;70 0;62 7;LAYER;2 b c;70 0;62 1",
            "BLOCK;2 D;10 0;20 0;LWPOLYLINE;8 0;90 3;70 1;10 0;20 0;42 0.5;10 1;20 0;10 1;20 1;CIRCLE;8 b c;10 3;20 3;40 1;ENDBLK",
            """
            LINE;8 a;10 0;20 0;11 2;21 0
            LINE;8 a;10 2;20 0;11 2;21 2
            ARC;8 a;10 1;20 2;40 1;50 0;51 180
            LINE;8 a;10 0;20 2;11 0;21 0
            INSERT;8 a;2 D;10 5;20 5;41 2;42 -1;50 30;70 2;71 2;44 4;45 4
            ELLIPSE;8 b c;10 1;20 1;11 3;21 0;40 0.5;41 0;42 4
            POLYLINE;8 a;66 1;70 1;10 0;20 0;VERTEX;10 0;20 9;42 0.3;VERTEX;10 2;20 9;VERTEX;10 2;20 12;SEQEND
            SPLINE;8 b c;70 8;71 2;40 0;40 0;40 0;40 1;40 1;40 1;41 1;41 2;41 1;10 0;20 0;10 1;20 2;10 2;20 0
            POINT;8 a;10 1;20 1
            """);
    private static final String[] SHARDS = {
        "0",
        "10",
        "20",
        "-1",
        "1e30",
        "1e99",
        "1e308",
        "1e-320",
        "nan",
        "",
        "LINE",
        "SEQEND",
        "ENDSEC",
        "SECTION",
        "INSERT",
        "D",
        "999",
        "70",
        "42",
        "\r",
        "\u0000",
        "  ",
        "180",
        "360",
        "0.0000001",
        "3.0",
        "ELLIPSE",
        "SPLINE",
        "ARC",
        "50"
    };

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void damagedFilesNeverHangOrEscape(long seed) {
        Random random = new Random(seed);
        List<String> sound = List.of(SOUND.split("\n"));
        for (int round = 0; round < 2500; round++) {
            List<String> lines = new ArrayList<>(sound);
            for (int k = random.nextInt(5); k >= 0; k--) {
                int at = random.nextInt(lines.size());
                switch (random.nextInt(4)) {
                    case 0 -> lines.remove(at);
                    case 1 -> lines.add(at, SHARDS[random.nextInt(SHARDS.length)]);
                    case 2 -> lines.set(at, SHARDS[random.nextInt(SHARDS.length)]);
                    default -> lines.set(at, lines.get(random.nextInt(lines.size())));
                }
            }
            byte[] bytes = String.join("\n", lines).getBytes(StandardCharsets.UTF_8);
            for (int k = random.nextInt(3); k > 1; k--) {
                bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(256);
            }
            DrawnDxf drawn = DrawnDxf.read(bytes, Optional.empty(), random.nextBoolean() ? Double.NaN : 0.01);
            assertThat(drawn.outline.elements().size() + drawn.findings.all().size())
                    .as("seed %d, round %d", seed, round)
                    .isPositive();
        }
    }
}
