package spanwright.fault;

import java.util.ArrayList;
import java.util.List;
import spanwright.fault.GlassPart.Kind;
import spanwright.plant.LengthBasis;
import spanwright.plant.SheathPlace;
import spanwright.plant.SheathPositions;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.trace.Fiber;

/**
 * The glass between a point and the nearest one whose reading is known: what a place's doubt grows over. One thread's.
 */
final class Approach {

    private final GlassParts parts;
    private final Anchor before;
    private final List<Anchor> after;
    private final double glassSince;
    private final double glassUntil;
    private final List<Stretch> stretches = new ArrayList<>();

    /**
     * Glass of one fiber on the way.
     *
     * @param fiber the fiber
     * @param from sheath position at its lower side
     * @param to sheath position at its upper side
     * @param place the sheath position of the point, where it lies in this fiber, else of the side nearer to it
     * @param holdsPlace whether the point lies in this fiber
     */
    record Stretch(Fiber fiber, Length from, Length to, Length place, boolean holdsPlace) {

        Length sheath() {
            return to.minus(from);
        }

        double glass() {
            return fiber.lay().glass(sheath()).metres();
        }

        /** Sheath whose structures are placed by lengths of route alone, as far as the nearest mark or known point. */
        double unmarked() {
            SheathPositions positions = fiber.lay().positions();
            if (!holdsPlace) {
                return positions.basis(from, to) == LengthBasis.MARKS ? 0 : sheath().metres();
            }
            return positions.ties().size() < 2
                    ? sheath().metres()
                    : Math.min(sheath().metres(), toNearestTie(positions));
        }

        /** Whether a run row is on the way, or beside the place. */
        boolean regards(int row) {
            SheathPositions positions = fiber.lay().positions();
            SheathPlace at = positions.place(place);
            boolean beside = holdsPlace && (row == at.row() || (at.onSpan() && row == at.row() - 1));
            return beside
                    || (positions.in(row).compareTo(to) < 0
                            && positions.out(row).compareTo(from) > 0);
        }

        private double toNearestTie(SheathPositions positions) {
            return positions.ties().stream()
                    .mapToDouble(
                            tie -> positions.position(tie).minus(place).abs().metres())
                    .min()
                    .orElseThrow();
        }
    }

    /**
     * A coil on the way.
     *
     * @param length sheath in it
     * @param known whether marks or a person tell its length
     */
    record Coil(Length length, boolean known) {}

    Approach(GlassRuler ruler, Spot spot) {
        this.parts = ruler.parts();
        List<Anchor> anchors = ruler.anchors();
        int next = 0;
        while (next < anchors.size() && (spot.pastEnd() || anchors.get(next).part() <= spot.part())) {
            next++;
        }
        this.before = anchors.get(Math.max(0, next - 1));
        this.after = anchors.subList(Math.max(1, next), anchors.size());
        this.glassSince = spot.glass().metres() - ruler.glassTo(before.part());
        this.glassUntil =
                calibrated() ? ruler.glassTo(after.get(0).part()) - spot.glass().metres() : Double.POSITIVE_INFINITY;
        cover(spot);
    }

    /** Whether an event stands behind the point as well, so that the glass is stretched there to fit. */
    boolean calibrated() {
        return !after.isEmpty();
    }

    /** The known point before it: the port, or an event. */
    Anchor before() {
        return before;
    }

    /** Where it lies between the two known points, from 0 to 1; 0 where there is none behind it. */
    double share() {
        double whole = glassSince + glassUntil;
        return calibrated() && whole > 0 ? glassSince / whole : 0;
    }

    List<Stretch> stretches() {
        return stretches;
    }

    private void cover(Spot spot) {
        if (spot.part() < 0) {
            return;
        }
        boolean back = glassSince <= glassUntil;
        int from = back ? before.part() : spot.part();
        int to = back ? spot.part() + 1 : after.get(0).part();
        for (int part = from; part < to; part++) {
            if (parts.part(part).kind() == Kind.SHEATH) {
                stretches.add(stretch((Fiber) parts.element(part), part == spot.part(), spot, back));
            }
        }
    }

    private static Stretch stretch(Fiber fiber, boolean holdsPlace, Spot spot, boolean back) {
        Length far = back ? fiber.fromPosition() : fiber.toPosition();
        Length near = back ? fiber.toPosition() : fiber.fromPosition();
        Length place = holdsPlace ? Placing.position(fiber, spot.within()) : near;
        boolean rising = far.compareTo(place) <= 0;
        return new Stretch(fiber, rising ? far : place, rising ? place : far, place, holdsPlace);
    }

    /** The coils on the way, and those at the structures beside the place: their sheath may have been drawn on. */
    List<Coil> coils() {
        List<Coil> coils = new ArrayList<>();
        for (Stretch stretch : stretches) {
            CableLay lay = stretch.fiber().lay();
            SheathPositions positions = lay.positions();
            for (int row = 0; row < positions.rows(); row++) {
                if (positions.coil(row).micrometres() > 0 && stretch.regards(row)) {
                    coils.add(new Coil(positions.coil(row), known(lay, row)));
                }
            }
        }
        return coils;
    }

    private static boolean known(CableLay lay, int row) {
        long marks =
                lay.positions().ties().stream().filter(tie -> tie.row() == row).count();
        return marks == 2 || lay.rows().get(row).slackTrust() != Trust.UNKNOWN;
    }
}
