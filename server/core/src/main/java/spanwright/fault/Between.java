package spanwright.fault;

import java.util.List;
import java.util.Optional;
import spanwright.quantity.Length;
import spanwright.trace.Element;
import spanwright.trace.Fiber;

/**
 * What lies between the places of two shots, one from each end.
 *
 * @param from the place of the shot from the near end
 * @param to the place of the shot from the far end
 * @param glass glass from the one to the other by the records; below 0 where the two shots overlap
 * @param sheath sheath from the one to the other; below 0 where they overlap
 */
public record Between(FaultPlace from, FaultPlace to, Length glass, Length sheath) {

    /** Standard uncertainties within which about 95 of 100 true values lie. */
    private static final double COVERAGE = 2;

    /** The first of several far places that lies in a cable of the near path, laid along that path. */
    static Optional<Between> find(FaultPlace near, List<FaultPlace> far) {
        return far.stream()
                .map(each -> of(near, each))
                .flatMap(Optional::stream)
                .findFirst();
    }

    private static Optional<Between> of(FaultPlace near, FaultPlace far) {
        Fiber fiber = far.where().fiber();
        Length position = far.where().sheathPosition();
        if (fiber == null || position == null) {
            return Optional.empty();
        }
        Length glass = Length.ZERO;
        Length sheath = Length.ZERO;
        for (Element element : near.path().elements()) {
            if (element instanceof Fiber on && holds(on, fiber, position)) {
                Length walked = position.minus(on.fromPosition()).abs();
                glass = glass.plus(on.fromTray()).plus(on.lay().glass(walked));
                sheath = sheath.plus(walked);
                return Optional.of(
                        new Between(near, far, glass.minus(near.recordedGlass()), sheath.minus(near.sheath())));
            }
            glass = glass.plus(element.glass());
            sheath = sheath.plus(element instanceof Fiber on ? on.sheath() : Length.ZERO);
        }
        return Optional.empty();
    }

    private static boolean holds(Fiber on, Fiber fiber, Length position) {
        Length low = on.ahead() ? on.fromPosition() : on.toPosition();
        Length high = on.ahead() ? on.toPosition() : on.fromPosition();
        return on.cable().id() == fiber.cable().id() && low.compareTo(position) <= 0 && high.compareTo(position) >= 0;
    }

    /**
     * Whether the two shots see one break: no more lies between them than two cursors may stand apart. Lengths of the
     * records are left out of this, so that a damaged length is shown rather than explained away.
     */
    public boolean oneBreak() {
        double near = from.uncertainty().of(Cause.CURSOR).metres();
        double far = to.uncertainty().of(Cause.CURSOR).metres();
        return sheath.metres() <= COVERAGE * Math.hypot(near, far);
    }

    /** How far the length between may be off, all causes but the map regarded. */
    public Length within() {
        return Length.ofMetres(COVERAGE * Math.hypot(alongSheath(from), alongSheath(to)));
    }

    private static double alongSheath(FaultPlace place) {
        double whole = place.uncertainty().within().metres() / COVERAGE;
        double map = place.uncertainty().of(Cause.MAP).metres();
        return Math.sqrt(Math.max(0, whole * whole - map * map));
    }
}
