package sill.record;

import java.math.BigDecimal;
import sill.formula.PrintedResult;
import sill.values.Datum;
import sill.values.Result;

/**
 * What a working is held against: the result's text in the record.
 *
 * @param shown how the record prints it
 */
record ResultText(Result result, ShownValue shown) implements PrintedResult {
    @Override
    public String shown(String component) {
        if (!component.isEmpty()) {
            return shown.components().getOrDefault(component, "");
        }
        return result.value() instanceof Datum.Fields ? "" : shown.text();
    }

    @Override
    public String shown(String component, double value) {
        return ShownValue.of(result, component, like(datum(component), value));
    }

    private Datum datum(String component) {
        return result.value() instanceof Datum.Fields fields
                ? fields.fields().getOrDefault(component, result.value())
                : result.value();
    }

    private static Datum like(Datum pattern, double value) {
        if (pattern instanceof Datum.Truth) {
            return new Datum.Truth(value != 0);
        } else if (pattern instanceof Datum.Whole && value == Math.rint(value) && Double.isFinite(value)) {
            return new Datum.Whole(BigDecimal.valueOf(value).toBigInteger().toString());
        }
        return new Datum.Real(value);
    }
}
