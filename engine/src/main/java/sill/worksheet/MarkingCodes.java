package sill.worksheet;

import sill.units.Unit;
import sill.words.Quoted;
import sill.worksheet.NumberReader.Numeral;

/** Whether a marking code and the unit behind it go together. */
final class MarkingCodes {
    private MarkingCodes() {}

    /**
     * The unit that a code and its unit mean together: {@code kΩ} for {@code 8k2 Ω}.
     *
     * @param numeral a number written as a code
     * @param symbol the unit as written
     * @param start where the unit starts
     * @param glued whether no space stands between the two
     */
    static Unit unit(Numeral numeral, String symbol, int start, boolean glued) throws TextException {
        MarkingLetter letter = numeral.code().orElseThrow();
        Unit unit = WrittenQuantity.unit(symbol, start);
        if (unit.symbol().equals(letter.unit())) {
            return WrittenQuantity.unit(letter.prefix() + letter.unit(), start);
        }
        boolean toleranceLetter = glued && symbol.length() == 1 && symbol.charAt(0) <= 'Z';
        throw new TextException(
                numeral.start(),
                "Found the marking code " + Quoted.of(numeral.text()) + " before " + Quoted.of(unit.symbol())
                        + ", expected " + letter.unit() + " or no unit",
                toleranceLetter
                        ? "A tolerance letter is written out, such as '± 5 %'."
                        : "Write the number out, such as " + Quoted.of(writtenOut(numeral, letter, unit)) + ".");
    }

    private static String writtenOut(Numeral numeral, MarkingLetter letter, Unit unit) {
        String digits = numeral.value()
                .scaleByPowerOfTen(-letter.exponent())
                .stripTrailingZeros()
                .toPlainString();
        boolean marked = unit.symbol().equals("Ω") || unit.symbol().equals("F");
        String symbol = letter.prefix() + (marked ? letter.unit() : unit.symbol());
        return digits + " " + (Unit.isUnit(symbol) ? symbol : letter.prefix() + letter.unit());
    }
}
