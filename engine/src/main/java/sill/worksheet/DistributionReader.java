package sill.worksheet;

import java.util.List;
import sill.words.NearestWord;
import sill.words.Quoted;
import sill.worksheet.Given.Distribution;
import sill.worksheet.Given.Tolerance;

/** Reads {@code ~ uniform}, {@code ~ normal k} or {@code ~ triangular}. */
final class DistributionReader {
    private static final List<String> WORDS = List.of("uniform", "normal", "triangular");

    /** How many standard deviations the limits of {@code normal} are off when the line does not say. */
    private static final double USUAL_DEVIATIONS = 3;

    /** Limits typed in decimals are alike in spite of the last binary digits. */
    private static final double ALIKE = 1e-9;

    private DistributionReader() {}

    static Distribution read(Cursor cursor, double nominal, Tolerance tolerance) throws TextException {
        cursor.skipSpace();
        int tilde = cursor.position();
        if (!cursor.take("~")) {
            return new Distribution.Uniform();
        }
        if (tolerance instanceof Tolerance.None) {
            throw new TextException(
                    tilde,
                    "Found a distribution without limits, expected limits before '~'",
                    "Write them first, such as '± 5 % ~ normal 3'.");
        }
        cursor.skipSpace();
        int start = cursor.position();
        if (cursor.takeWord("uniform")) {
            return new Distribution.Uniform();
        }
        if (cursor.takeWord("triangular")) {
            return new Distribution.Triangular();
        }
        if (cursor.takeWord("normal")) {
            return normal(cursor, start, nominal, tolerance);
        }
        String word = cursor.word();
        throw new TextException(
                start,
                "Found " + (word.isEmpty() ? "the end" : Quoted.of(word))
                        + ", expected uniform, normal or triangular after '~'",
                NearestWord.hint(word, WORDS, ""));
    }

    private static Distribution normal(Cursor cursor, int start, double nominal, Tolerance tolerance)
            throws TextException {
        double k = USUAL_DEVIATIONS;
        cursor.skipSpace();
        if (!cursor.atEnd() && cursor.peek() != '|') {
            WrittenQuantity deviations = WrittenQuantity.read(cursor);
            if (!deviations.bare() || deviations.number().signum() <= 0) {
                throw new TextException(
                        deviations.start(),
                        "Found " + Quoted.of(deviations.text())
                                + ", expected how many standard deviations the limits are off, a number above 0",
                        "Write 'normal 3'.");
            }
            k = deviations.si();
        }
        double above = tolerance.high(nominal) - nominal;
        double below = nominal - tolerance.low(nominal);
        if (Math.abs(above - below) > ALIKE * Math.max(above, below)) {
            throw new TextException(
                    start,
                    "Found 'normal' on limits at unlike distances, expected limits alike on both sides",
                    "Write 'triangular', or limits at one distance from the nominal value.");
        }
        return new Distribution.Normal(k);
    }
}
