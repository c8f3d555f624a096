package spanwright.fault;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.fault.EventFit.Fit;
import spanwright.fault.GlassPart.Kind;
import spanwright.fault.NotPlaced.Part;
import spanwright.quantity.Length;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.SplitterCrossing;

/** A reading laid along one path. One thread's. */
final class PathShot {

    /** Half a micrometre: what rounding to the micrometre can do to a length. */
    private static final double ROUNDING = 5e-7;

    private final GlassParts parts;
    private final @Nullable GlassRuler ruler;
    private final @Nullable Spot spot;
    private final @Nullable NotPlaced refusal;

    private PathShot(GlassParts parts, @Nullable GlassRuler ruler, @Nullable Spot spot, @Nullable NotPlaced refusal) {
        this.parts = parts;
        this.ruler = ruler;
        this.spot = spot;
        this.refusal = refusal;
    }

    static PathShot of(GlassParts parts, Reading reading, GlassIndex index) {
        Optional<Double> first = parts.size() > 0 ? Optional.of(parts.part(0).index()) : index.findJumpers();
        if (first.isEmpty() || (parts.size() == 0 && parts.unknownBeyond() != null)) {
            return refused(parts, Part.WAVELENGTH, Objects.requireNonNullElse(parts.unknownBeyond(), ""));
        }
        double launch = reading.launch().metres() * first.get();
        double optical = reading.distance().metres() * index.set();
        if (optical < launch - ROUNDING) {
            return refused(
                    parts,
                    Part.DISTANCE,
                    "the reading of " + reading.distance() + " lies within the launch fiber of " + reading.launch()
                            + "; read beyond it");
        }
        Fit fit = EventFit.of(parts, reading.events(), index.set(), launch);
        return fit.ruler() == null
                ? refused(parts, Part.EVENT, Objects.requireNonNull(fit.wrong()))
                : located(fit.ruler(), optical);
    }

    private static PathShot refused(GlassParts parts, Part part, String sentence) {
        return new PathShot(parts, null, null, new NotPlaced(part, sentence));
    }

    private static PathShot located(GlassRuler ruler, double optical) {
        return ruler.locate(optical)
                .map(spot -> new PathShot(ruler.parts(), ruler, spot, null))
                .orElseGet(() -> refused(
                        ruler.parts(),
                        Part.WAVELENGTH,
                        Objects.requireNonNull(ruler.parts().unknownBeyond())));
    }

    @Nullable
    NotPlaced refusal() {
        return refusal;
    }

    private Spot spot() {
        return Objects.requireNonNull(spot);
    }

    /** What tells its place from that on another path of the same shot: the ways taken at splitters before it. */
    List<Integer> branch() {
        List<Element> elements = parts.path().elements();
        boolean whole = spot().pastEnd() || spot().part() < 0;
        int until = whole ? elements.size() : parts.part(spot().part()).element();
        List<Integer> branch = new ArrayList<>(List.of(spot().part(), spot().pastEnd() ? 1 : 0));
        for (Element element : elements.subList(0, until)) {
            if (element instanceof SplitterCrossing crossing) {
                branch.addAll(List.of(crossing.splitter().id(), crossing.input(), crossing.output()));
            }
        }
        return branch;
    }

    FaultPlace place(Placing placing, GlassIndex index) {
        Where where = placing.place(parts, spot());
        Uncertainty uncertainty = new UncertaintyModel(index).of(Objects.requireNonNull(ruler), spot(), where);
        Length sheath = sheath();
        return new FaultPlace(
                parts.path(),
                where,
                spot().glass(),
                sheath,
                recordedGlass(),
                spot().over(),
                uncertainty,
                Window.of(parts.path(), sheath, uncertainty.within()));
    }

    private Length sheath() {
        int part = spot().part();
        if (part < 0) {
            return Length.ZERO;
        }
        Length before = parts.sheathBefore(part);
        if (parts.part(part).kind() != Kind.SHEATH) {
            return before;
        }
        Fiber fiber = (Fiber) parts.element(part);
        return before.plus(Placing.position(fiber, spot().within())
                .minus(fiber.fromPosition())
                .abs());
    }

    private Length recordedGlass() {
        Length glass = spot().within();
        for (int part = 0; part < spot().part(); part++) {
            glass = glass.plus(parts.part(part).length());
        }
        return glass;
    }
}
