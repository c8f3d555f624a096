package sallowmere.geo;

/**
 * A place on the plane that touches the earth at the false origin.
 *
 * @param x metres east of the false origin
 * @param y metres north of the false origin
 */
public record Point(double x, double y) {

    /** This place moved by another taken as a vector. */
    public Point plus(Point other) {
        return new Point(x + other.x, y + other.y);
    }

    /** The vector from another place to this one. */
    public Point minus(Point other) {
        return new Point(x - other.x, y - other.y);
    }

    /** This vector stretched. */
    public Point times(double factor) {
        return new Point(x * factor, y * factor);
    }

    /** Length of this vector in metres. */
    public double length() {
        return Math.sqrt(x * x + y * y);
    }

    /** Metres on the plane to another place. */
    public double to(Point other) {
        return minus(other).length();
    }

    /** This vector at length one; it must not be nought. */
    public Point unit() {
        double length = length();
        if (length == 0) {
            throw new IllegalStateException("a vector without length has no direction");
        }
        return times(1 / length);
    }

    /** This vector turned a quarter to the left. */
    public Point left() {
        return new Point(-y, x);
    }

    /** The inner product of two vectors. */
    public double dot(Point other) {
        return x * other.x + y * other.y;
    }

    /** The place that lies at a fraction of the way to another. */
    public Point toward(Point other, double fraction) {
        return plus(other.minus(this).times(fraction));
    }
}
