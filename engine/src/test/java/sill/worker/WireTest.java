package sill.worker;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowable;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import sill.sheet.Place;
import sill.worksheet.Worksheet;

/** What crosses between the processes comes back as it was, and broken bytes give a {@link WireIn.BadMessage} and nothing else. */
class WireTest {
    /** A sheet with every kind of value, a plot, problems and a table. */
    private static final String SHEET = """
            sill 1
            title: T
            :: given G
            vIn = 5 V ± 1 %
            temps = [-10, 25] °C
            part = "film µ"
            bench = file "a.csv"
            wrong = 5 Vx
            :: calc C
            TripPoints t = new TripPoints(3, 2); // [V] caption
            Plots.line("title", "x", "y", temps, temps)
            var all = Arrays.asList(1, 2.5, "s", true, null, Map.of("k", List.of(1)), new Object());
            System.out.println("printed");
            :: calc Broken
            double x = nothing;
            :: calc Ends
            double y = 1 / 0;
            :: tolerance Spread
            of: vIn / 2, new TripPoints(vIn, vIn - 1 / vIn)
            method: worst-case, rss, monte-carlo 1000 seed 7
            over: vIn
            :: check R
            vIn / 2 at least 2.49 V in 50 %
            t.rising() at least 1 V
            y at most 3
            1 / 0 at most 3
            """;

    private static final Map<String, byte[]> FILES = Map.of("a.csv", "a [mV],b\n1,x\n".getBytes());

    private final List<Report> reports = Sheets.reports(SHEET, FILES);
    private final Job job = JobWriter.job(Worksheet.parse(SHEET), FILES, Set.of(new Place(3, 1)));

    @Test
    void reportsComeBackAsTheyWere() {
        assertThat(reports).hasSizeGreaterThan(8);
        for (Report report : reports) {
            assertThat(Report.of(report.bytes()).bytes()).isEqualTo(report.bytes());
        }
        assertThat(reports)
                .filteredOn(report -> !hasPlot(report))
                .allSatisfy(report -> assertThat(Report.of(report.bytes())).isEqualTo(report));
    }

    @Test
    void jobsComeBackAsTheyWere() {
        Job read = Job.of(job.bytes());

        assertThat(read.source()).isEqualTo(job.source());
        assertThat(read.leftOut()).isEqualTo(job.leftOut());
        assertThat(read.bytes()).isEqualTo(job.bytes());
    }

    @Test
    void everyPrefixIsABadMessage() {
        for (Report report : reports) {
            byte[] bytes = report.bytes();
            for (int end = 0; end < bytes.length; end++) {
                byte[] prefix = Arrays.copyOf(bytes, end);
                assertThatThrownBy(() -> Report.of(prefix)).isInstanceOf(WireIn.BadMessage.class);
            }
        }
        byte[] bytes = job.bytes();
        for (int end = 0; end < bytes.length; end++) {
            byte[] prefix = Arrays.copyOf(bytes, end);
            assertThatThrownBy(() -> Job.of(prefix)).isInstanceOf(WireIn.BadMessage.class);
        }
    }

    @Test
    void whatGoesOnBehindItsEndIsABadMessage() {
        for (Report report : reports) {
            byte[] longer = Arrays.copyOf(report.bytes(), report.bytes().length + 1);
            assertThatThrownBy(() -> Report.of(longer))
                    .isInstanceOf(WireIn.BadMessage.class)
                    .hasMessage("message goes on for 1 bytes behind its end");
        }
    }

    @Test
    void flippedBytesAreABadMessageOrAMessage() {
        Random random = new Random(20260101);
        for (Report report : reports) {
            byte[] bytes = report.bytes();
            for (int round = 0; round < 2_000; round++) {
                byte[] flipped = bytes.clone();
                int flips = 1 + random.nextInt(4);
                for (int i = 0; i < flips; i++) {
                    flipped[random.nextInt(flipped.length)] ^= (byte) (1 << random.nextInt(8));
                }
                Throwable thrown = catchThrowable(() -> Report.of(flipped));
                if (thrown != null) {
                    assertThat(thrown).isInstanceOf(WireIn.BadMessage.class);
                }
            }
        }
    }

    @Test
    void aClaimedLengthIsHeldAgainstWhatIsThere() {
        byte[] list = new WireOut().number(0).number(Integer.MAX_VALUE).bytes();

        assertThatThrownBy(() -> Report.of(list))
                .isInstanceOf(WireIn.BadMessage.class)
                .hasMessage("message claims 2147483647 items with 0 bytes left");
    }

    @Test
    void anUnknownKindIsABadMessage() {
        assertThatThrownBy(() -> Report.of(new WireOut().number(9).bytes()))
                .isInstanceOf(WireIn.BadMessage.class)
                .hasMessage("there is no kind of report 9");
    }

    private static boolean hasPlot(Report report) {
        return report instanceof Report.CellEnded ended
                && ended.results().stream().anyMatch(result -> result.plot().isPresent());
    }
}
