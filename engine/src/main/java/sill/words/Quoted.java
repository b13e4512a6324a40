package sill.words;

/** Text from a worksheet as a message quotes it. */
public final class Quoted {
    /** Longer text is cut, so that a message stays one line. */
    private static final int LONGEST = 40;

    private Quoted() {}

    /**
     * The text in single quotes, at most {@value #LONGEST} characters of it, with characters that do not print written as
     * {@code U+0000}.
     */
    public static String of(String text) {
        StringBuilder quoted = new StringBuilder("'");
        int shown = 0;
        int at = 0;
        while (at < text.length() && shown < LONGEST) {
            int point = text.codePointAt(at);
            quoted.append(isPrintable(point) ? Character.toString(point) : name(point));
            at += Character.charCount(point);
            shown++;
        }
        return quoted.append(at < text.length() ? "…'" : "'").toString();
    }

    /** The code point's number as the Unicode standard writes it, such as {@code U+00A0}. */
    public static String name(int point) {
        StringBuilder hex = new StringBuilder(Integer.toHexString(point).toUpperCase(java.util.Locale.ROOT));
        while (hex.length() < 4) {
            hex.insert(0, '0');
        }
        return "U+" + hex;
    }

    private static boolean isPrintable(int point) {
        return switch (Character.getType(point)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.PRIVATE_USE,
                    Character.UNASSIGNED,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }
}
