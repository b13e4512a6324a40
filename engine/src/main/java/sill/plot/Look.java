package sill.plot;

/**
 * How the curves of one plot are told apart: by a colour that eyes with a colour deficiency can tell from its neighbours,
 * and by a dash or marker as well, so that a print in grey still serves. The page overrides the colours by class.
 *
 * @param number from 1, used in the class name
 * @param colour for a drawing on its own, on white
 * @param dash stroke pattern, empty for a full line
 * @param marker path of a marker about its own centre
 */
record Look(int number, String colour, String dash, String marker) {
    // Hues after Okabe and Ito, Color Universal Design (2008), darkened to a contrast of at least 4.5 on white.
    private static final String[] COLOURS = {"#0b62a4", "#a8480a", "#0a7357", "#8a4580", "#54595f"};
    // One more dash than colours, so that thirty curves differ before both repeat.
    private static final String[] DASHES = {"", "9 4", "2 3", "9 3 2 3", "15 4", "5 2"};
    private static final String[] MARKERS = {
        "m-3 0a3 3 0 1 0 6 0a3 3 0 1 0-6 0",
        "m-3-3h6v6h-6z",
        "m0-3.6l3.6 6.2h-7.2z",
        "m0-4l4 4-4 4-4-4z",
        "m-3-3l6 6m0-6l-6 6"
    };

    /** The look of a curve by its place in the plot, from 0. */
    static Look of(int index) {
        int colour = index % COLOURS.length;
        return new Look(colour + 1, COLOURS[colour], DASHES[index % DASHES.length], MARKERS[index % MARKERS.length]);
    }
}
