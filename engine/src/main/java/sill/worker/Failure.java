package sill.worker;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.Stream;
import sill.sheet.Place;
import sill.sheet.TranslatedSheet;
import sill.worksheet.Problem;

/** Puts an exception that ended a cell into words, at the place of the worksheet it came from. */
final class Failure {
    private static final int LONGEST_MESSAGE = 2_000;

    private Failure() {}

    /**
     * The problem that an exception is.
     *
     * @param lineOffset line number of the class text's first line in the compiled class
     */
    static Problem problem(TranslatedSheet sheet, TranslatedSheet.Step step, Throwable thrown, int lineOffset) {
        Place place = place(sheet, thrown, lineOffset, step.place());
        return Problem.error(
                place.line(), place.column(), step.cell(), step.where() + ": ended in " + words(thrown), hint(thrown));
    }

    private static Place place(TranslatedSheet sheet, Throwable thrown, int lineOffset, Place otherwise) {
        StackTraceElement[] frames = thrown.getStackTrace();
        if (frames == null) {
            return otherwise;
        }
        Stream<Place> places = Arrays.stream(frames)
                .filter(frame -> isOurs(frame, sheet) && frame.getLineNumber() >= lineOffset)
                .map(frame -> sheet.code().linePlace(frame.getLineNumber() - lineOffset + 1));
        // Where a recursion overflows is an accident; the calls that it goes round in are not.
        return thrown instanceof StackOverflowError
                ? places.skip(1).min(Comparator.naturalOrder()).orElse(otherwise)
                : places.findFirst().orElse(otherwise);
    }

    private static boolean isOurs(StackTraceElement frame, TranslatedSheet sheet) {
        String name = "$" + sheet.className();
        return frame.getClassName().endsWith(name) || frame.getClassName().contains(name + "$");
    }

    private static String words(Throwable thrown) {
        String name = thrown.getClass().getSimpleName();
        String message;
        try {
            message = thrown.getMessage();
        } catch (RuntimeException | Error e) {
            message = null;
        }
        if (message == null || message.isBlank()) {
            return name;
        }
        String cut = message.length() <= LONGEST_MESSAGE ? message : message.substring(0, LONGEST_MESSAGE) + "…";
        // The JDK's own messages name the class that the sheet became, and where it was loaded.
        return name + ": "
                + cut.replaceAll("(REPL\\.)?\\$JShell\\$\\w+\\$\\$Sheet[.$]?", "")
                        .replaceAll(" \\([^()]* (?:is|are) in (?:unnamed )?module [^()]*\\)", "");
    }

    private static String hint(Throwable thrown) {
        if (thrown instanceof StackOverflowError) {
            return "A method calls itself without an end. Give it a case that stops.";
        }
        if (thrown instanceof ArithmeticException) {
            return "Whole numbers divide as whole numbers. Write 1.0 where a fraction is meant.";
        }
        return "";
    }
}
