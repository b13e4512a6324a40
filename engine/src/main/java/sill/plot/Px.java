package sill.plot;

/** Lengths of a drawing in its own units, which a browser shows as CSS pixels; one decimal is finer than the eye. */
final class Px {
    private Px() {}

    static String text(double length) {
        long tenths = Math.round(length * 10);
        String sign = tenths < 0 ? "-" : "";
        long size = Math.abs(tenths);
        return size % 10 == 0 ? sign + size / 10 : sign + size / 10 + "." + size % 10;
    }

    /** A path command at a point, as {@code M12 40.5}. */
    static String at(char command, double x, double y) {
        return command + text(x) + " " + text(y);
    }
}
