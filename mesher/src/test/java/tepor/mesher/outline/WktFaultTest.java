package tepor.mesher.outline;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Everything wrong in well-known text is found at its exact place. */
class WktFaultTest {
    private static final DrawingUnit METRE = new DrawingUnit("m", 1);

    /** A second line is sound, and must be read all the same. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '~',
            value = {
                "1 | 1  | 'POLYGN'; write POLYGON            | POLYGN ((0 0, 1 0, 1 1, 0 0))",
                "1 | 4  | 'SQUARE'; use POLYGON              | a: SQUARE ((0 0, 1 0, 1 1, 0 0))",
                "1 | 32 | 3, 5, 7; this one has 4; middle point | CIRCULARSTRING (0 0, 1 1, 2 0, 3 1)",
                "1 | 16 | this one has 2                     | CIRCULARSTRING (0 0, 1 1)",
                "1 | 49 | begins at (2.5 0) m; ends at (2 0) m; gap of 0.5 m; where the one before it ends | COMPOUNDCURVE (CIRCULARSTRING (0 0, 1 1, 2 0), (2.5 0, 3 0))",
                "1 | 49 | one point only                     | COMPOUNDCURVE (CIRCULARSTRING (0 0, 1 1, 2 0), (2 0))",
                "1 | 41 | does not close; (2 0) m; repeat    | CURVEPOLYGON (CIRCULARSTRING (0 0, 1 1, 2 0))",
                "1 | 15 | 'POLYGON' cannot stand; COMPOUNDCURVE | CURVEPOLYGON (POLYGON ((0 0, 1 0, 1 1, 0 0)))",
                "1 | 16 | 'COMPOUNDCURVE' cannot stand       | COMPOUNDCURVE (COMPOUNDCURVE ((0 0, 1 1)))",
                "1 | 15 | '(' is missing; '0'                | CURVEPOLYGON (0 0, 1 0, 1 1, 0 0)",
                "1 | 15 | empty                              | CURVEPOLYGON (EMPTY)",
                "1 | 30 | encloses nothing; opposite         | CURVEPOLYGON (CIRCULARSTRING (0 0, 0 0, 0 0))",
                "1 | 16 | all points of this line            | CIRCULARSTRING (1 1, 1 1, 1 1)",
                "1 | 1  | GEOMETRYCOLLECTION; not read       | GEOMETRYCOLLECTION (POINT (0 0))",
                "1 | 1  | LINEARRING; not read               | LINEARRING (0 0, 1 0, 1 1, 0 0)",
                "1 | 1  | SRID; leave                        | SRID=4326;POINT (0 0)",
                "1 | 9  | empty                              | POLYGON EMPTY",
                "1 | 15 | empty                              | MULTIPOLYGON (EMPTY, ((0 0, 1 0, 1 1, 0 0)))",
                "1 | 8  | empty                              | POINT (EMPTY)",
                "1 | 20 | surplus; more numbers; POLYGON Z   | POLYGON ((0 0, 1 0 5, 1 1, 0 0))",
                "1 | 20 | more numbers; comma                | POLYGON ((0 0, 1 0 1 1, 0 0))",
                "1 | 14 | no y; x, blank, y                  | LINESTRING (0, 0, 1 1)",
                "1 | 9  | no y                               | POINT (0,5 1,5)",
                "1 | 18 | 'nan' is no coordinate             | LINESTRING (0 0, nan 1)",
                "1 | 20 | '-Infinity' is no coordinate       | LINESTRING (0 0, 1 -Infinity)",
                "1 | 8  | '1e400' is too large; finite       | POINT (1e400 0)",
                "1 | 10 | '1e101' is too large               | POINT (0 1e101)",
                "1 | 8  | '0x10' is no number                | POINT (0x10 0)",
                "1 | 8  | '1d' is no number                  | POINT (1d 0)",
                "1 | 10 | '1.2.3' is no number               | POINT (0 1.2.3)",
                "1 | 10 | '−5' is no number; -3.5            | POINT (0 −5)",
                "1 | 10 | '5;' is no number                  | POINT (0 5;)",
                "1 | 33 | does not close; (0 0) m; (0 1) m; repeat the first point | POLYGON ((0 0, 1 0, 1 1, 0.5 2, 0 1))",
                "1 | 10 | 3 points; at least three different | POLYGON ((0 0, 1 1, 0 0))",
                "1 | 10 | 2 points                           | POLYGON ((0 0, 1 1))",
                "1 | 10 | 1 point encloses                   | POLYGON ((0 0))",
                "1 | 12 | one point; two different           | LINESTRING (0 0)",
                "1 | 12 | all points of this line            | LINESTRING (1 1, 1 1)",
                "1 | 11 | several; one point only; MULTIPOINT | POINT (0 0, 1 1)",
                "1 | 7  | '(' is missing; '0'                | POINT 0 0",
                "1 | 10 | '(' is missing; '0'                | POLYGON (0 0, 1 0, 1 1, 0 0)",
                "1 | 8  | x) is missing; '('                 | POINT ((0 0))",
                "1 | 18 | a number (x) is missing; ')'       | LINESTRING (0 0, )",
                "1 | 12 | after the end; ')'                 | POINT (0 0))",
                "1 | 13 | after the end; 'POINT'             | POINT (0 0) POINT (1 1)",
                "1 | 12 | after the end; ';'                 | POINT (0 0);",
                "1 | 1  | no name; leave out the colon       | : POINT (0 0)",
                "1 | 4  | missing before '('                 | a: (0 0, 1 1)",
                "1 | 1  | 'abc'; a name takes a colon        | abc",
                "1 | 4  | 'Polyline'; use POLYGON            | a: Polyline (0 0, 1 1)",
            })
    void faultsAreFoundAtTheirPlace(int line, int column, String words, String text) {
        Findings findings = new Findings();
        Outline outline = WktReader.read("part.wkt", text + "\nsound: POINT (7 8)\n", METRE, findings);
        assertThat(findings.all()).singleElement().satisfies(f -> {
            assertThat(f.severity()).isEqualTo(Finding.Severity.ERROR);
            assertThat(f.place()).isEqualTo(new Place("part.wkt", line, column));
            for (String word : words.split("; ?")) {
                assertThat(f.code() + ": " + f.what() + "; " + f.remedy()).contains(word.strip());
            }
        });
        assertThat(outline.find("sound", OutlineElement.Kind.POINT)).hasSize(1);
    }

    @Test
    void aMissingBracketIsReportedWhereTheTextGoesWrongAndNamesTheOpenOne() {
        Findings findings = new Findings();
        WktReader.read("part.wkt", "a: POLYGON ((0 0, 1 0,\n  1 1, 0 0)\n\n# end\n", METRE, findings);
        assertThat(findings.all()).singleElement().satisfies(f -> {
            assertThat(f.place()).isEqualTo(new Place("part.wkt", 5, 1));
            assertThat(f.what()).contains("the end of the text");
            assertThat(f.remedy()).contains("line 1, column 12");
        });
        Findings next = new Findings();
        Outline outline = WktReader.read("part.wkt", "a: POINT (0 0\nb: POINT (1 1)\n", METRE, next);
        assertThat(next.all()).singleElement().satisfies(f -> {
            assertThat(f.place()).isEqualTo(new Place("part.wkt", 2, 1));
            assertThat(f.remedy()).contains("line 1, column 10");
        });
        assertThat(outline.elements()).extracting(OutlineElement::name).containsExactly("b");
    }

    @Test
    void aFileWithoutGeometryIsAnError() {
        for (String text : new String[] {"", "\uFEFF", "  \n# nothing yet\n"}) {
            Findings findings = new Findings();
            assertThat(WktReader.read("part.wkt", text, METRE, findings).elements())
                    .isEmpty();
            assertThat(findings.all()).extracting(Finding::code).containsExactly("empty-outline");
        }
    }

    @Test
    void unseenCharactersAreShownByTheirNumber() {
        Findings findings = new Findings();
        WktReader.read("part.wkt", "POINT (1\u200B 2)", METRE, findings);
        assertThat(findings.all())
                .singleElement()
                .satisfies(f -> assertThat(f.what()).contains("U+200B"));
    }

    @Test
    void damagedTextNeverHangsOrEscapes() {
        String sound =
                "a b: POLYGON ((0 0, 4 0, 4 3, 0 0), (1 1, 2 1, 2 2, 1 1))\nMULTIPOINT Z ((0 0 1), (1 1 2)) # c\n";
        String[] shards = {"(", ")", ",", ":", "#", "\n", " ", "EMPTY", "Z", "1e5", "nan", "POINT", "\r", "\uFEFF", "\0"
        };
        Random random = new Random(42);
        for (int round = 0; round < 4_000; round++) {
            StringBuilder text = new StringBuilder(sound);
            for (int k = 0; k <= random.nextInt(5); k++) {
                int at = random.nextInt(text.length());
                if (random.nextBoolean()) {
                    text.delete(at, Math.min(text.length() - 1, at + 1 + random.nextInt(6)));
                } else {
                    text.insert(at, shards[random.nextInt(shards.length)]);
                }
            }
            Findings findings = new Findings();
            Outline outline = WktReader.read("part.wkt", text.toString(), METRE, findings);
            String lines = text.toString().replace("\r\n", "\n").replace('\r', '\n');
            int lineCount = (int) lines.chars().filter(c -> c == '\n').count() + 1;
            assertThat(findings.all())
                    .allSatisfy(f -> assertThat(f.place().line()).isBetween(1, lineCount));
            assertThat(outline.elements().size() + findings.all().size()).isPositive();
        }
    }
}
