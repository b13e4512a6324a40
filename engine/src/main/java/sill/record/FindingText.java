package sill.record;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Collectors;
import sill.record.DesignRecord.GivenEntry;
import sill.units.Notation;
import sill.units.Unit;
import sill.values.Finding;

/** What a tolerance cell found, as a record prints it. */
public final class FindingText {
    private final Unit unit;
    private final Unit exact;

    public FindingText(Finding finding) {
        unit = Units.of(finding.unit());
        exact = finding.shownIn().isEmpty() ? null : Units.of(finding.shownIn());
    }

    /** A value with its unit. */
    public String number(double value) {
        return exact == null ? Notation.shown(value, unit) : Notation.shownIn(value, exact);
    }

    /** A distance of two values with its unit: of temperatures in °C it is in K. */
    public String distance(double value) {
        return Notation.shown(value, unit);
    }

    /** Two values, as in {@code 4.981 V .. 5.312 V}. */
    public String range(double low, double high) {
        return number(low) + " .. " + number(high);
    }

    /** A slope: the result's unit over the given's. */
    public String slope(double slope, Unit givenUnit) {
        return Notation.shown(slope, Unit.ofDimension(unit.dimension().over(givenUnit.dimension())));
    }

    /** Figures that the table has no room for, by name. */
    public Map<String, String> figures(Finding finding) {
        Map<String, String> figures = new LinkedHashMap<>();
        finding.rootSumSquare()
                .ifPresent(found -> figures.put("Standard uncertainty", distance(found.standardUncertainty())));
        finding.monteCarlo().ifPresent(found -> figures.putAll(figures(found)));
        return figures;
    }

    private Map<String, String> figures(Finding.MonteCarlo found) {
        Map<String, String> figures = new LinkedHashMap<>();
        figures.put("Samples", grouped(found.samples()) + ", seed " + found.seed());
        if (found.notFinite() > 0) {
            figures.put(
                    "Not finite",
                    grouped(found.notFinite()) + " of them, " + grouped(found.thrown())
                            + " by an exception; the figures below are those of the others");
        }
        figures.put("Mean", number(found.mean()) + error(found.errors().get("mean")));
        figures.put(
                "Standard deviation",
                distance(found.sd()) + error(found.errors().get("sd")));
        Double low = found.errors().get("low");
        Double high = found.errors().get("high");
        figures.put(
                "Shortest 95 % interval",
                range(found.low(), found.high())
                        + (low == null || high == null
                                ? ""
                                : ", standard errors " + distance(low) + " and " + distance(high)));
        String quantileErrors = found.quantiles().keySet().stream()
                .filter(found.errors()::containsKey)
                .map(probability ->
                        percent(probability) + " " + distance(found.errors().get(probability)))
                .collect(Collectors.joining(", "));
        if (!quantileErrors.isEmpty()) {
            figures.put("Standard errors of quantiles", quantileErrors);
        }
        if (found.resolution() > 0) {
            figures.put(
                    "Counted in cells",
                    "quantiles and interval within " + distance(found.resolution()) + " of all samples sorted");
        }
        figures.put("Least, greatest", number(found.min()) + ", " + number(found.max()));
        return figures;
    }

    private String error(Double error) {
        return error == null ? "" : ", standard error by sampling " + distance(error);
    }

    /** A probability as {@code 99.865 %}. */
    public static String percent(String probability) {
        return new BigDecimal(probability)
                        .scaleByPowerOfTen(2)
                        .stripTrailingZeros()
                        .toPlainString() + Notation.SPACE + "%";
    }

    /** A share to one decimal, as {@code 12.5 %}. */
    public static String share(double share) {
        return BigDecimal.valueOf(share)
                        .scaleByPowerOfTen(2)
                        .setScale(1, RoundingMode.HALF_EVEN)
                        .toPlainString() + Notation.SPACE + "%";
    }

    /** Where a given stands: {@code lower limit}, {@code upper limit}, or its value. */
    public static String place(GivenEntry given, Unit unit, double value) {
        if (given.low().filter(low -> low == value).isPresent()) {
            return "lower limit";
        }
        if (given.high().filter(high -> high == value).isPresent()) {
            return "upper limit";
        }
        return unit.offset() == 0 ? Notation.shown(value, unit) : Notation.shownIn(value, unit);
    }

    /** Digits in groups of three: ISO 80000-1:2009, 7.3.1. */
    static String grouped(long whole) {
        String digits = Long.toString(whole);
        StringBuilder grouped = new StringBuilder();
        for (int i = 0; i < digits.length(); i++) {
            boolean starts = i > 0 && (digits.length() - i) % 3 == 0 && digits.length() > 4;
            grouped.append(starts ? String.valueOf(Notation.SPACE) : "").append(digits.charAt(i));
        }
        return grouped.toString();
    }
}
