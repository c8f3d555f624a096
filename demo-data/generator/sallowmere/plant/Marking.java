package sallowmere.plant;

/**
 * How the maker numbered a sheath.
 *
 * @param ink which set of numbers
 * @param unit m or ft
 * @param first the number at the start of the sheath
 * @param rising whether the numbers rise along the run
 */
public record Marking(String ink, String unit, double first, boolean rising) {
    /** Metres in a foot, exactly. */
    public static final double FOOT = 0.3048;

    /** The whole number nearest to a sheath position in metres; the very start keeps its tenths. */
    public double at(double position) {
        double units = unit.equals("ft") ? position / FOOT : position;
        double value = rising ? first + units : first - units;
        return position == 0 ? value : Math.floor(value + 0.5);
    }
}
