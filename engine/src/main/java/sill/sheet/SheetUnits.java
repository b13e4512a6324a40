package sill.sheet;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sill.inference.Inferred;
import sill.inference.Seeds;
import sill.inference.Slip;
import sill.units.Dimension;
import sill.units.Unit;
import sill.units.UnitException;
import sill.worksheet.Problem;

/** What the inference has to know of a sheet, and what the sheet takes from its answer. */
final class SheetUnits {
    private final Program program;

    SheetUnits(Program program) {
        this.program = program;
    }

    /** What is known before the inference starts, for the class's text. */
    Seeds seeds(MappedText text, Map<Integer, String> slots) {
        Map<String, Seeds.GivenValue> givens = new HashMap<>();
        for (SheetSource.GivenField given : program.presentGivens()) {
            Map<String, Dimension> columns = new HashMap<>();
            given.columns().forEach((name, unit) -> columns.put(name, dimension(unit)));
            Optional<Dimension> dimension =
                    given.unit().isEmpty() ? Optional.empty() : Optional.of(dimension(given.unit()));
            givens.put(given.name(), new Seeds.GivenValue(given.line(), dimension, columns));
        }
        Map<String, Unit> stated = new HashMap<>();
        for (Program.CellCode cell : program.cells()) {
            for (Program.Field field : cell.fields()) {
                field.snippet().caption().unit().ifPresent(unit -> stated.put(field.field(), unit));
            }
        }
        Map<String, Dimension> limits = new HashMap<>();
        for (Program.CheckCode check : program.checks()) {
            if (!check.line().unit().isEmpty()) {
                limits.put(
                        ClassText.checkMethod(check.line().place()),
                        dimension(check.line().unit()));
            }
        }
        return new Seeds(text.toString(), slots, givens, stated, limits, places(text));
    }

    private static Seeds.Places places(MappedText text) {
        String whole = text.toString();
        return new Seeds.Places() {
            @Override
            public int line(int offset) {
                return text.origin(offset).place().line();
            }

            @Override
            public String text(int start, int end) {
                MappedText.Origin from = text.origin(start);
                MappedText.Origin to = text.origin(end - 1);
                String made = whole.substring(start, end);
                if (from.piece() != to.piece() || to.offset() < from.offset()) {
                    return made;
                }
                String written = from.piece().text().substring(from.offset(), to.offset() + 1);
                // They differ by the line breaks that tell calls apart, or else by what was made up.
                return written.replace("\n", "").equals(made.replace("\n", "")) ? written : made;
            }
        };
    }

    /** The slips, where the worksheet's author finds them. */
    List<Problem> problems(Inferred inferred, MappedText text) {
        List<Problem> problems = new ArrayList<>();
        for (Slip slip : inferred.slips()) {
            MappedText.Origin origin = text.origin(slip.offset());
            Place place = slip.isInCaption() ? caption(slip.field()).orElse(origin.place()) : origin.place();
            problems.add(Problem.error(
                    place.line(),
                    place.column(),
                    origin.piece().cell(),
                    origin.piece().where() + ": " + slip.message(),
                    slip.hint()));
        }
        return problems;
    }

    /** A field's coherent unit: what its caption states, else what its value measures; empty when unknown. */
    static String unit(Program.Field field, Inferred inferred) {
        return field.snippet()
                .caption()
                .unit()
                .map(unit -> unit.coherent().symbol())
                .or(() -> Optional.ofNullable(inferred.fields().get(field.field()))
                        .map(Dimension::toString))
                .orElse("");
    }

    /** Coherent units of a record's components, as far as they are known. */
    static Map<String, String> components(Program.Field field, Inferred inferred) {
        Map<String, String> units = new LinkedHashMap<>();
        inferred.components()
                .getOrDefault(field.field(), Map.of())
                .forEach((name, dimension) -> units.put(name, dimension.toString()));
        return units;
    }

    private Optional<Place> caption(String field) {
        return program.cells().stream()
                .flatMap(cell -> cell.fields().stream())
                .filter(each -> each.field().equals(field))
                .map(each ->
                        each.snippet().piece().place(each.snippet().caption().at()))
                .findFirst();
    }

    private static Dimension dimension(String symbol) {
        try {
            return Unit.parse(symbol).dimension();
        } catch (UnitException e) {
            throw new IllegalArgumentException("unit must be a coherent unit's symbol, found \"" + symbol + "\"", e);
        }
    }
}
