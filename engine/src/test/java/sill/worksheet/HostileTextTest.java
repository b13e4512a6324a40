package sill.worksheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sill.words.Quoted;

/** Long and repeated text is read in one pass; the time limit only tells a hang from an end. */
class HostileTextTest {
    private static final Duration HANG = Duration.ofMinutes(5);
    private static final int REPEATS = 50_000;
    private static final int TEN_MEGABYTES = 10_000_000;

    private static final List<String> TOKENS = List.of(
            "(",
            ")",
            "[",
            "]",
            "{",
            "\"",
            "'",
            "\\",
            "|",
            "||",
            ",",
            ";",
            ":",
            "::",
            ":: ",
            ":: given x\n",
            ":: calc\n",
            "::\n",
            "\n",
            "\r",
            "\r\n",
            "\t",
            " ",
            "\u00a0",
            "\0",
            "\ud800",
            "\ufeff",
            "±",
            "+/-",
            "..",
            ".",
            "~",
            "~ normal ",
            "1",
            "1 ",
            "1,",
            "1.",
            "1e",
            "e9",
            "9k9",
            "-",
            "−",
            "×10",
            "V",
            "V·",
            "V/",
            "√",
            "sqrt(",
            "(V",
            "^",
            "²",
            "⁻",
            "%",
            "°C ",
            "of:",
            "of: a,",
            "x = ",
            "x = 1 V\n",
            "x =\n",
            "a, ",
            "at ",
            "at least ",
            "holds ",
            "+holds",
            "x holds ",
            "within ",
            "in ",
            "in 5 % ",
            " at worst-case",
            "// ",
            "/*",
            "file \"",
            "key: value\n",
            "title: x\n",
            "prose\n",
            "vary: q\n",
            "monte-carlo ",
            "x at least 1 V at worst-case\n",
            "é",
            "𝛺");

    private static final List<String> BEGINNINGS = List.of(
            "",
            "sill 1\ntitle: ",
            "sill 1\ntitle: T\n:: ",
            "sill 1\ntitle: T\n:: given G\n",
            "sill 1\ntitle: T\n:: given G\nx = [",
            "sill 1\ntitle: T\n:: given G\nx = 5 V ",
            "sill 1\ntitle: T\n:: given G\nx = 5 V [",
            "sill 1\ntitle: T\n:: given G\nx = \"",
            "sill 1\ntitle: T\n:: check C\n",
            "sill 1\ntitle: T\n:: check C\nx ",
            "sill 1\ntitle: T\n:: check C\nx at least 5 V ",
            "sill 1\ntitle: T\n:: tolerance S\nof: ",
            "sill 1\ntitle: T\n:: tolerance S\nmethod: ",
            "sill 1\ntitle: T\n:: tolerance S\nvary: ");

    /** Neighbours in the list take turns with the beginnings: all pairs would take minutes of a build server. */
    @TestFactory
    Stream<DynamicTest> everyTokenFiftyThousandTimes() {
        return IntStream.range(0, TOKENS.size())
                .mapToObj(i -> DynamicTest.dynamicTest(Quoted.of(TOKENS.get(i)), () -> {
                    for (int j = i % 2; j < BEGINNINGS.size(); j += 2) {
                        reads(BEGINNINGS.get(j) + TOKENS.get(i).repeat(REPEATS));
                    }
                }));
    }

    @TestFactory
    Stream<DynamicTest> aLineOfTenMegabytes() {
        return BEGINNINGS.stream()
                .map(beginning -> DynamicTest.dynamicTest(Quoted.of(beginning), () -> {
                    reads(beginning + "x".repeat(TEN_MEGABYTES));
                    reads(beginning + "1".repeat(TEN_MEGABYTES));
                    reads(beginning + "1, ".repeat(TEN_MEGABYTES / 3) + "]");
                }));
    }

    @Test
    void tenThousandCells() {
        StringBuilder text = new StringBuilder("sill 1\ntitle: T\n");
        for (int cell = 0; cell < 10_000; cell++) {
            text.append(
                    switch (cell % 5) {
                        case 0 -> ":: note N\ntext\n";
                        case 1 -> ":: given G\nx" + cell + " = 5 V ± 1 %\n";
                        case 2 -> ":: calc C\ndouble y" + cell + " = 1;\n";
                        case 3 ->
                            ":: tolerance S\nof: y" + (cell - 1) + "\nmethod: worst-case\nvary: x" + (cell - 2) + "\n";
                        default -> ":: check R\ny" + (cell - 2) + " at least 1 at worst-case\n";
                    });
        }
        Worksheet sheet = reads(text.toString());

        assertThat(sheet.problems()).isEmpty();
        assertThat(sheet.cells()).hasSize(10_000);
        assertThat(sheet.cells().get(9_999).number()).isEqualTo(10_000);
        assertThat(sheet.cells().get(9_999)).isInstanceOf(Cell.Checks.class);
    }

    @Test
    void tenThousandCellsThatAreWrong() {
        String cells =
                ":: given G\nx = 5 Vx\n:: tolerance S\nof: y\nvary: z, zz\n:: check R\ny at least 1 at worst-case\n";

        List<Problem> problems =
                reads("sill 1\ntitle: T\n" + cells.repeat(3_334)).problems();

        assertThat(problems).hasSize(1001);
        assertThat(problems.get(1000).message())
                .isEqualTo("Found more than 1000 problems, expected fewer; the others are left out");
    }

    private static Worksheet reads(String text) {
        return assertTimeoutPreemptively(HANG, () -> Worksheet.parse(text));
    }
}
