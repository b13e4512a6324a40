package sill.cli;

import java.io.PrintStream;
import java.util.Locale;

/** Where commands print. Text from worksheets can't steer a terminal: control characters are shown as their codes. */
final class Terminal {
    private static final String RESET = "\u001b[0m";
    private static final String BACK_AND_CLEAR = "\r\u001b[K";

    private final PrintStream out;
    private final PrintStream err;
    private final boolean live;
    private final boolean colours;

    /** Colours of a terminal; what they say is always said by a word as well. */
    enum Colour {
        GREEN("\u001b[32m"),
        RED("\u001b[31m"),
        YELLOW("\u001b[33m");

        private final String code;

        Colour(String code) {
            this.code = code;
        }
    }

    /**
     * A pair of streams.
     *
     * @param live whether somebody watches: progress is shown, and colours unless {@code NO_COLOR} is set
     */
    Terminal(PrintStream out, PrintStream err, boolean live) {
        this.out = out;
        this.err = err;
        this.live = live;
        String noColour = System.getenv("NO_COLOR");
        this.colours = live && (noColour == null || noColour.isEmpty());
    }

    /** Prints a line of any text. */
    void line(String text) {
        out.println(safe(text));
    }

    /** Prints a line that begins with a word in a colour. */
    void line(Colour colour, String word, String rest) {
        line("", colour, word, rest);
    }

    /** Prints a line with a word in a colour. */
    void line(String before, Colour colour, String word, String rest) {
        String coloured = colours ? colour.code + safe(word) + RESET : safe(word);
        out.println(safe(before) + coloured + safe(rest));
    }

    /** Says why a command can't do its work. */
    void error(String message, String mend) {
        err.println(safe("sill: " + message));
        if (!mend.isEmpty()) {
            err.println(safe("  mend: " + mend));
        }
    }

    /** Shows a line that the next one overwrites, when somebody watches. */
    void progress(String text) {
        if (live) {
            err.print(BACK_AND_CLEAR + safe(text));
            err.flush();
        }
    }

    /** The text with characters that could steer a terminal as codes such as {@code <U+001B>}. */
    static String safe(String text) {
        StringBuilder safe = new StringBuilder(text.length());
        text.codePoints().forEach(c -> {
            boolean steers =
                    switch (Character.getType(c)) {
                        case Character.CONTROL,
                                Character.FORMAT,
                                Character.SURROGATE,
                                Character.LINE_SEPARATOR,
                                Character.PARAGRAPH_SEPARATOR -> true;
                        default -> false;
                    };
            if (c == '\t') {
                safe.append(' ');
            } else if (steers) {
                safe.append(String.format(Locale.ROOT, "<U+%04X>", c));
            } else {
                safe.appendCodePoint(c);
            }
        });
        return safe.toString();
    }
}
