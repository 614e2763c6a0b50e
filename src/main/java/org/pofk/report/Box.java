package org.pofk.report;

/** A rectangle with its sides along the axes; {@code x} and {@code y} are its least. */
record Box(double x, double y, double width, double height) {

    static Box around(double centerX, double centerY, double width, double height) {
        return new Box(centerX - width / 2, centerY - height / 2, width, height);
    }

    double right() {
        return x + width;
    }

    double bottom() {
        return y + height;
    }

    double centerX() {
        return x + width / 2;
    }

    double centerY() {
        return y + height / 2;
    }

    /** Whether they have an inside in common. */
    boolean overlaps(Box other) {
        return x < other.right() && other.x < right() && y < other.bottom() && other.y < bottom();
    }

    boolean contains(double pointX, double pointY) {
        return x <= pointX && pointX <= right() && y <= pointY && pointY <= bottom();
    }

    boolean contains(Box other) {
        return contains(other.x, other.y) && contains(other.right(), other.bottom());
    }

    Box grown(double by) {
        return new Box(x - by, y - by, width + 2 * by, height + 2 * by);
    }
}
