package sill.tests.worksheets;

import java.math.BigDecimal;
import org.assertj.core.api.Condition;

/** A printed figure: a value agrees with it when it lies within half a unit of the figure's last digit. */
final class Figure {
    private Figure() {}

    /**
     * The condition of agreeing.
     *
     * @param printed a decimal number, digits and power of ten as they count: {@code 66.7e3} holds to ±50
     */
    static Condition<Double> of(String printed) {
        BigDecimal figure = new BigDecimal(printed);
        BigDecimal half = figure.ulp().movePointLeft(1).multiply(BigDecimal.valueOf(5));
        return new Condition<>(
                value -> Double.isFinite(value)
                        && new BigDecimal(value).subtract(figure).abs().compareTo(half) <= 0,
                "%s ± %s",
                printed,
                half);
    }
}
