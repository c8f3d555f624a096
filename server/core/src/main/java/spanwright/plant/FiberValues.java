package spanwright.plant;

import org.jspecify.annotations.Nullable;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * What a fiber type does at one wavelength.
 *
 * @param wavelength where these values hold
 * @param lossPerKm expected loss a kilometre
 * @param lossLimitPerKm the most it may lose a kilometre
 * @param groupIndex group index, or null where not known
 */
public record FiberValues(
        Wavelength wavelength,
        Loss lossPerKm,
        Loss lossLimitPerKm,
        @Nullable Double groupIndex) {}
