package spanwright.loss;

/**
 * A value of glass at one wavelength.
 *
 * @param value loss in dB/km, or a group index
 * @param basis {@link LossBasis#TYPE} or {@link LossBasis#SHEET}
 * @param source where it comes from, for a person
 */
public record TableValue(double value, LossBasis basis, String source) {}
