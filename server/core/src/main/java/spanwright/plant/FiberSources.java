package spanwright.plant;

/**
 * Where the values of a built-in fiber type at one wavelength come from.
 *
 * @param loss source of the expected loss
 * @param limit source of the limit
 * @param index source of the group index
 * @param dispersion source of the zero-dispersion wavelength, the slope and the PMD coefficient
 */
public record FiberSources(Source loss, Source limit, Source index, Source dispersion) {}
