package sill.record.html;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import sill.record.DesignRecord;

/** A record's entries by the number of their cell, and their trace. */
record CellContent(
        Map<Integer, List<DesignRecord.GivenEntry>> givensByCell,
        Map<Integer, List<DesignRecord.ValueEntry>> valuesByCell,
        Map<Integer, List<DesignRecord.ToleranceEntry>> tolerancesByCell,
        Map<Integer, List<DesignRecord.CheckEntry>> checksByCell,
        Map<Integer, List<DesignRecord.PlotEntry>> plotsByCell,
        RecordTrace trace) {

    static CellContent of(DesignRecord record, RecordTrace trace) {
        return new CellContent(
                byCell(record.givens(), DesignRecord.GivenEntry::at),
                byCell(record.values(), DesignRecord.ValueEntry::at),
                byCell(record.tolerances(), DesignRecord.ToleranceEntry::at),
                byCell(record.checks(), DesignRecord.CheckEntry::at),
                byCell(record.plots(), DesignRecord.PlotEntry::at),
                trace);
    }

    List<DesignRecord.GivenEntry> givens(int cell) {
        return givensByCell.getOrDefault(cell, List.of());
    }

    List<DesignRecord.ValueEntry> values(int cell) {
        return valuesByCell.getOrDefault(cell, List.of());
    }

    List<DesignRecord.ToleranceEntry> tolerances(int cell) {
        return tolerancesByCell.getOrDefault(cell, List.of());
    }

    Map<String, DesignRecord.GivenEntry> givensByName() {
        Map<String, DesignRecord.GivenEntry> byName = new HashMap<>();
        givensByCell.values().forEach(those -> those.forEach(given -> byName.put(given.name(), given)));
        return byName;
    }

    List<DesignRecord.CheckEntry> checks(int cell) {
        return checksByCell.getOrDefault(cell, List.of());
    }

    List<DesignRecord.PlotEntry> plots(int cell) {
        return plotsByCell.getOrDefault(cell, List.of());
    }

    private static <T> Map<Integer, List<T>> byCell(List<T> entries, Function<T, String> at) {
        Map<Integer, List<T>> grouped = new HashMap<>();
        for (T entry : entries) {
            grouped.computeIfAbsent(Addresses.cell(at.apply(entry)), cell -> new ArrayList<>())
                    .add(entry);
        }
        return grouped;
    }
}
