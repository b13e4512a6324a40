package sill.tests.commands;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunCommandTest {
    @TempDir
    Path folder;

    @Test
    void checksThatHoldExitWith0() throws IOException {
        Path sheet = Cli.sheet(folder, "gate.sill", """
                sill 1
                title: Gate

                :: given Inputs
                v = 5 V

                :: calc Half
                double half = v / 2; // [V]

                :: check Limits
                half within 2 V .. 4 V | REQ-1
                half > 0 holds
                """);

        Cli.Ran ran = Cli.run("run", sheet);

        assertThat(ran.err()).isEmpty();
        assertThat(ran.out()).isEqualTo("""
                        gate.sill "Gate": 1 of 1 calculation cells ran, 1 value
                          3.1  holds       half within 2 V .. 4 V  2.500 V, limit 2 V .. 4 V, margin +500.0 mV (50 %)
                          3.2  holds       half > 0 holds          true
                        holds: 2 of 2 checks hold
                        record: "FOLDER/gate.html"
                        """.replace(
                        "\"FOLDER/gate.html\"", folder.resolve("gate.html").toString())
                .replace(" V", "\u00a0V")
                .replace("within 2\u00a0V .. 4\u00a0V ", "within 2 V .. 4 V ")
                .replace(" mV", "\u00a0mV"));
        assertThat(ran.code()).isZero();
        assertThat(folder.resolve("gate.json")).isRegularFile();
    }

    @Test
    void aFailingCheckExitsWith1() throws IOException {
        Path sheet =
                Cli.sheet(folder, "a.sill", "sill 1\ntitle: T\n:: calc C\ndouble x = 3;\n:: check L\nx at most 2\n");

        Cli.Ran ran = Cli.run("run", sheet);

        assertThat(ran.out())
                .contains("4.1".replace('4', '2')
                        + "  fails       x at most 2  3.000, limit ≤\u00a02, margin −1.000 (−50 %)")
                .contains("fails: 0 of 1 checks hold");
        assertThat(ran.code()).isEqualTo(1);
    }

    @Test
    void aProblemShowsItsLineWithACaretAndExitsWith2() throws IOException {
        Path sheet =
                Cli.sheet(folder, "a.sill", "sill 1\ntitle: T\n:: calc C\ndouble x = 3;\ndouble y = x + \"\" - 1;\n");

        Cli.Ran ran = Cli.run("run", sheet);

        assertThat(ran.out())
                .contains("problem at line 5, column 19: Cell 1 'C': found String - int, which has no meaning")
                .contains("  5 | double y = x + \"\" - 1;\n    |                   ^\n")
                .contains("incomplete: 1 problem, there are no checks");
        assertThat(ran.code()).isEqualTo(2);
        assertThat(folder.resolve("a.html")).isRegularFile();
    }

    @Test
    void theWorstOfSeveralSheetsDecidesAndAllAreRun() throws IOException {
        Path good = Cli.sheet(folder, "good.sill", "sill 1\ntitle: T\n:: calc C\ndouble x = 3;\n");
        Path bad = Cli.sheet(folder, "bad.sill", "sill 1\ntitle: T\n:: check L\n3 at most 2\n");

        Cli.Ran ran = Cli.run("run", bad, good, "--quiet", "--out", folder.resolve("records"));

        assertThat(ran.out()).isEmpty();
        assertThat(ran.code()).isEqualTo(1);
        try (Stream<Path> written = Files.list(folder.resolve("records"))) {
            assertThat(written.map(file -> file.getFileName().toString()))
                    .containsExactlyInAnyOrder("good.html", "good.json", "bad.html", "bad.json");
        }
    }

    @Test
    void aLimitStopsACellAndTheRestIsInTheRecord() throws IOException {
        Path sheet = Cli.sheet(folder, "a.sill", """
                sill 1
                title: T
                :: calc Before
                double x = 3;
                :: calc Endless
                while (x > 0) { }
                double y = 4;
                :: calc Behind
                double z = x + 1;
                double w = y;
                :: calc Beside
                double u = x + 1;
                """);

        Cli.Ran ran = Cli.run("run", sheet, "--time-limit", "1500ms");

        assertThat(ran.code()).isEqualTo(2);
        assertThat(ran.out())
                .contains("2 of 4 calculation cells ran")
                .contains("Cell 2 'Endless': stopped, it took longer than 1500 ms");
        String json = Files.readString(folder.resolve("a.json"));
        assertThat(json)
                .contains("\"state\": \"stopped\"")
                .contains("waits on y (cell 2)")
                .contains("\"name\": \"u\"");
    }

    @Test
    void sameTextGivesTheSameBytes() throws IOException {
        Path sheet = Cli.sheet(folder, "a.sill", """
                sill 1
                title: T
                :: calc C
                enum Side { LOW, HIGH }
                Map<Side, Double> levels = new HashMap<>();
                for (Side side : Side.values()) { levels.put(side, sin(side.ordinal() + 1)); }
                Set<String> names = Set.of("a", "b", "c", "d", "e");
                TripPoints trip = Comparators.noninverting(2, 1e3, 1e5, 0, 5);
                """);
        Cli.run("run", sheet, "--quiet", "--out", folder.resolve("1"));
        Cli.run("run", sheet, "--quiet", "--out", folder.resolve("2"));

        for (String name : new String[] {"a.json", "a.html"}) {
            String first = Files.readString(folder.resolve("1").resolve(name));
            String second = Files.readString(folder.resolve("2").resolve(name));
            String when = "\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d:\\d\\dZ";
            assertThat(second.replaceAll(when, "WHEN")).isEqualTo(first.replaceAll(when, "WHEN"));
        }
    }
}
