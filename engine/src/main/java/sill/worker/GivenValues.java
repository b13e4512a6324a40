package sill.worker;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sill.sheet.SheetSource;
import sill.sheet.SheetSource.GivenField;
import sill.sheet.SheetSource.GivenType;
import sill.words.Quoted;
import sill.worksheet.Problem;

/**
 * The Java values of a job's givens.
 *
 * @param source the job's source, where a given whose file is no table is missing
 * @param values values by name
 * @param problems why files are no tables, each at its given's line
 */
record GivenValues(SheetSource source, Map<String, Object> values, List<Problem> problems) {
    static GivenValues of(Job job) {
        List<GivenField> givens = new ArrayList<>();
        Map<String, Object> values = new LinkedHashMap<>();
        List<Problem> problems = new ArrayList<>();
        for (GivenField given : job.source().givens()) {
            try {
                if (given.type() == GivenType.TABLE
                        && job.values().get(given.name()) instanceof Job.GivenValue.File file) {
                    TableReader.Read read = TableReader.read(file.bytes());
                    values.put(given.name(), read.table());
                    givens.add(given.withColumns(read.units()));
                } else {
                    if (given.type() != GivenType.MISSING) {
                        values.put(given.name(), value(job.values().get(given.name())));
                    }
                    givens.add(given);
                }
            } catch (TableReader.NoTable e) {
                givens.add(new GivenField(given.name(), GivenType.MISSING, given.cell(), given.line(), ""));
                problems.add(Problem.error(
                        given.line(),
                        1,
                        given.cell(),
                        "Data file of " + Quoted.of(given.name()) + ": " + e.getMessage(),
                        "Give comma separated text in UTF-8, a header line first, numbers with a decimal point."));
            }
        }
        SheetSource source =
                new SheetSource(givens, job.source().cells(), job.source().checks());
        return new GivenValues(source, values, problems);
    }

    private static Object value(Job.GivenValue value) {
        if (value instanceof Job.GivenValue.Number number) {
            return number.value();
        } else if (value instanceof Job.GivenValue.Numbers numbers) {
            return numbers.values();
        } else if (value instanceof Job.GivenValue.Text text) {
            return text.value();
        }
        throw new IllegalArgumentException("given has no value: " + value);
    }

    /** Sets the fields of the sheet's class. */
    void set(Class<?> sheet) throws ReflectiveOperationException {
        for (Map.Entry<String, Object> value : values.entrySet()) {
            sheet.getField(value.getKey()).set(null, value.getValue());
        }
    }

    /** The givens that have a value, by name. */
    List<GivenField> present() {
        return source.givens().stream()
                .filter(given -> values.containsKey(given.name()))
                .toList();
    }
}
