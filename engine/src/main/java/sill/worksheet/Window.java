package sill.worksheet;

import sill.units.Unit;
import sill.words.Quoted;

/** Two limits written {@code low .. high}, the lower one first. */
record Window(WrittenQuantity low, WrittenQuantity high) {

    /** Reads two limits; {@code start} is where a message about the whole points. */
    static Window read(Cursor cursor, int start) throws TextException {
        WrittenQuantity low = WrittenQuantity.read(cursor);
        cursor.skipSpace();
        if (!cursor.take("..")) {
            throw TextException.expected("'..' between two limits", cursor, "Write 'low .. high'.");
        }
        WrittenQuantity high = WrittenQuantity.read(cursor);
        if (!low.fits(high.unit()) && !high.isBareZero()) {
            WrittenQuantity lame = low.bare() ? low : high;
            throw new TextException(
                    lame.start(),
                    "Found the limits " + Quoted.of(low.text()) + " and " + Quoted.of(high.text())
                            + ", expected units that fit each other",
                    low.bare() != high.bare() ? "Each limit carries its unit." : "");
        }
        if (low.isBareZero() && high.unit().offset() != 0) {
            throw zeroWithoutScale(low, high.unit());
        }
        if (high.isBareZero() && low.unit().offset() != 0) {
            throw zeroWithoutScale(high, low.unit());
        }
        if (low.si() > high.si()) {
            throw new TextException(
                    start,
                    "Found the limits " + Quoted.of(low.text()) + " .. " + Quoted.of(high.text())
                            + ", expected the lower one first",
                    "Swap them.");
        }
        return new Window(low, high);
    }

    static TextException zeroWithoutScale(WrittenQuantity zero, Unit unit) {
        return new TextException(
                zero.start(),
                "Found the temperature '0' without its unit, expected °C or K",
                "Write '0 " + unit.symbol() + "' or '0 K'.");
    }
}
