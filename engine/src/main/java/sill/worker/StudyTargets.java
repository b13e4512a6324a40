package sill.worker;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.sheet.Slice;
import sill.values.Datum;
import sill.values.Result;

/** What a tolerance cell studies, told from the nominal values of its expressions: numbers, and records of numbers. */
final class StudyTargets {
    private final List<Slice.Output> outputs = new ArrayList<>();
    private final List<Double> nominal = new ArrayList<>();

    /** Adds an expression; false when its value is neither a number nor a record of numbers. */
    boolean add(String field, Result result) {
        Optional<Double> number = number(result.value());
        if (number.isPresent()) {
            outputs.add(new Slice.Output(field, List.of()));
            nominal.add(number.get());
            return true;
        }
        if (!(result.value() instanceof Datum.Fields fields) || fields.fields().isEmpty()) {
            return false;
        }
        List<Double> numbers = new ArrayList<>();
        for (Map.Entry<String, Datum> component : fields.fields().entrySet()) {
            number(component.getValue()).ifPresent(numbers::add);
        }
        if (numbers.size() < fields.fields().size()) {
            return false;
        }
        outputs.add(new Slice.Output(field, List.copyOf(fields.fields().keySet())));
        nominal.addAll(numbers);
        return true;
    }

    private static Optional<Double> number(Datum value) {
        if (value instanceof Datum.Real real) {
            return Optional.of(real.value());
        }
        return value instanceof Datum.Whole whole ? Optional.of(Double.valueOf(whole.digits())) : Optional.empty();
    }

    List<Slice.Output> outputs() {
        return outputs;
    }

    /** The values of all outputs, records by component. */
    double[] nominal() {
        return nominal.stream().mapToDouble(Double::doubleValue).toArray();
    }
}
