package sill.plot;

/**
 * The rectangle in which curves are drawn, and the ranges it shows.
 *
 * @param left its left edge on the drawing
 * @param top its upper edge
 * @param width its width
 * @param height its height
 * @param x range of the horizontal axis
 * @param y range of the vertical axis
 */
record Frame(double left, double top, double width, double height, AxisRange x, AxisRange y) {
    double right() {
        return left + width;
    }

    double bottom() {
        return top + height;
    }

    double px(double value) {
        return left + width * x.fraction(value);
    }

    double py(double value) {
        return bottom() - height * y.fraction(value);
    }
}
