package sill.plot;

/** Lengths of a drawing in its own units, which a browser shows as CSS pixels; one decimal is finer than the eye. */
public final class Px {
    private Px() {}

    /** A length as SVG writes it, as {@code 40.5}. */
    public static String text(double length) {
        return write(new StringBuilder(8), length).toString();
    }

    /** A path command at a point, as {@code M12 40.5}. */
    static String at(char command, double x, double y) {
        return write(new StringBuilder(16), command, x, y).toString();
    }

    /** Appends a path command at a point. */
    public static StringBuilder write(StringBuilder path, char command, double x, double y) {
        write(path.append(command), x).append(' ');
        return write(path, y);
    }

    private static StringBuilder write(StringBuilder text, double length) {
        long tenths = Math.round(length * 10);
        if (tenths < 0) {
            text.append('-');
        }
        long size = Math.abs(tenths);
        text.append(size / 10);
        return size % 10 == 0 ? text : text.append('.').append(size % 10);
    }
}
