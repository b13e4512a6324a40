package sill.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import sill.units.PublishedTable;

/** Figures of a file of published values: case, quantity, value, distance allowed, source. */
final class Published {
    private final List<String[]> rows;

    Published(String file) {
        rows = PublishedTable.rows(file, 5);
    }

    /** Compares, with some sampling error on top of what the row allows; there must be such a row. */
    void compare(String of, String quantity, double found, double samplingError) {
        String[] row = rows.stream()
                .filter(each -> each[0].equals(of) && each[1].equals(quantity))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no row " + of + ", " + quantity));
        assertThat(found)
                .as("%s, %s: %s", of, quantity, row[4])
                .isCloseTo(Double.parseDouble(row[2]), within(Double.parseDouble(row[3]) + 4 * samplingError));
    }

    boolean has(String of, String quantity) {
        return rows.stream().anyMatch(each -> each[0].equals(of) && each[1].equals(quantity));
    }

    /** Compares all that the file has for a case. */
    void compare(String of, Findings found) {
        compareIfThere(of, "nominal", found.nominal(), 0);
        found.rss().ifPresent(rss -> compareIfThere(of, "standard uncertainty", rss.standardUncertainty(), 0));
        found.monteCarlo().flatMap(MonteCarlo::statistics).ifPresent(statistics -> {
            compare(of, "mean", statistics.mean());
            compare(of, "sd", statistics.sd());
            compare(of, "low", statistics.low());
            compare(of, "high", statistics.high());
            compareIfThere(
                    of,
                    "width",
                    statistics.high().value() - statistics.low().value(),
                    Math.hypot(
                            statistics.quantiles().get(1).estimate().standardError(),
                            statistics.quantiles().get(3).estimate().standardError()));
        });
    }

    private void compare(String of, String quantity, Estimate found) {
        compareIfThere(of, quantity, found.value(), found.standardError());
    }

    private void compareIfThere(String of, String quantity, double found, double samplingError) {
        if (has(of, quantity)) {
            compare(of, quantity, found, samplingError);
        }
    }
}
