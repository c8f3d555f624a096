package spanwright.planning;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import spanwright.loss.GlassValues;
import spanwright.loss.LossReckoner;
import spanwright.loss.PlanningLosses;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.plant.Enclosure;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Splice;
import spanwright.trace.Tracer;

/** What a path may do at the end of a spare fiber, and what it costs there and along the glass. One thread's. */
final class SpareEnds {

    /** One new splice; below it unverified joints, below them microdecibels. */
    static final long SPLICE = 1L << 50;

    static final long UNVERIFIED = 1L << 38;

    private final SpareGlass glass;
    private final Network network;
    private final Records records;
    private final Tracer tracer;
    private final LossReckoner reckoner;
    private final GlassValues values;
    private final Wavelength wavelength;
    private final Loss splice;
    private final Map<Integer, CableLay> lays = new HashMap<>();
    private final Map<Integer, Loss> joints = new HashMap<>();
    private final Map<Integer, Length> sheaths = new HashMap<>();

    SpareEnds(SpareGlass glass, Wavelength wavelength) {
        this.glass = glass;
        this.network = glass.snapshot().network();
        this.records = glass.snapshot().records();
        this.tracer = new Tracer(glass.snapshot());
        this.reckoner = new LossReckoner(records, wavelength);
        this.values = new GlassValues(records);
        this.wavelength = wavelength;
        this.splice =
                new PlanningLosses(records).find("splice.fusion").orElseThrow().expected();
    }

    /** The glass. */
    SpareGlass glass() {
        return glass;
    }

    /** How a cable lies. */
    CableLay lay(int cable) {
        return lays.computeIfAbsent(cable, id -> CableLay.of(records, id));
    }

    /** Whether a fiber goes through uncut at an end. */
    boolean isUncut(int end) {
        return network.joint(end) == 0 && network.peer(end) != Network.NONE;
    }

    /** Whether an end may be joined anew, or a path begin there: cut, or to be cut without harm to what works. */
    boolean isFreeable(int end) {
        return glass.enclosure(end) != 0 && glass.freeable().freeing(end) != OpenTubes.Cutting.FORBIDDEN;
    }

    /** The rear of the port on which an end of a fiber is terminated, if it is. */
    Optional<Integer> findRear(int end) {
        int peer = network.peer(end);
        return peer != Network.NONE && network.blockOf(peer >> 1).kind() == BlockKind.PANEL
                ? Optional.of(peer)
                : Optional.empty();
    }

    /** Whether an end is terminated on a port into which a jumper can be plugged. */
    boolean isPatchable(int end) {
        return glass.enclosure(end) != 0
                && findRear(end).filter(rear -> glass.isFrontFree(rear ^ 1)).isPresent();
    }

    /** What it costs to begin or end a path there: at the port's rear, if it has one; nothing where it may not. */
    OptionalLong terminal(int end) {
        Optional<Integer> rear = findRear(end);
        if (rear.isPresent()) {
            return OptionalLong.of(crossing(end, rear.get()));
        }
        return isFreeable(end) ? OptionalLong.of(micro(cutting(end))) : OptionalLong.empty();
    }

    /** What it costs to cross what joins two ends. */
    long crossing(int from, int to) {
        return (isUnverified(from) ? UNVERIFIED : 0) + micro(joint(from, to));
    }

    /** Whether the joint at an end is one that nobody has verified. */
    boolean isUnverified(int end) {
        int id = network.joint(end);
        return id != 0 && records.joints().get(id).facts().trust() != Trust.VERIFIED;
    }

    /** What it costs to come to a new splice, or to leave it: the tray glass of a fiber that is cut for it. */
    long splicing(int end) {
        return micro(cutting(end));
    }

    /** What a new splice costs, its ends apart. */
    long newSplice() {
        return SPLICE + micro(splice);
    }

    /** What a patch costs on one side: the way to the front. */
    long patching(int end) {
        int rear = findRear(end).orElseThrow();
        return crossing(end, rear) + micro(connector(rear));
    }

    /** What the jumper itself costs. */
    long newJumper() {
        return micro(jumper());
    }

    /** What the glass of a fiber costs, as it is cut now. */
    long along(int piece) {
        return micro(findLoss(piece, false, false).orElse(Loss.ZERO));
    }

    private static long micro(Loss loss) {
        return Math.max(0, loss.microdecibels());
    }

    private Loss cutting(int end) {
        return isUncut(end) ? over(end >> 1, tray(end)).orElse(Loss.ZERO) : Loss.ZERO;
    }

    /** What a joint that is there loses; nothing is lost in a direct termination and in uncut glass. */
    Loss joint(int from, int to) {
        return network.joint(from) == 0
                ? Loss.ZERO
                : joints.computeIfAbsent(Math.min(from, to), key -> sum(tracer.along(from ^ 1, to), Splice.class));
    }

    /** What a connector pair loses. */
    Loss connector(int rear) {
        return sum(tracer.along(rear), Connector.class);
    }

    private Loss sum(List<Element> elements, Class<? extends Element> type) {
        return elements.stream()
                .filter(type::isInstance)
                .flatMap(element -> reckoner.findExpected(element).stream())
                .reduce(Loss.ZERO, Loss::plus);
    }

    /** What a new splice loses. */
    Loss splice() {
        return splice;
    }

    /** What the glass of a new jumper loses. */
    Loss jumper() {
        return values.findJumperLoss(wavelength)
                .map(value -> Loss.ofDecibels(NewJoint.JUMPER_METRES / 1000.0 * value.value()))
                .orElse(Loss.ZERO);
    }

    /** The glass of a fiber, cut at its ends where it is cut now or must be. */
    Length glass(int piece, boolean cutAtStart, boolean cutAtEnd) {
        Length length = sheath(piece);
        if (cutAtStart || !isUncut(2 * piece)) {
            length = length.plus(tray(2 * piece));
        }
        return cutAtEnd || !isUncut(2 * piece + 1) ? length.plus(tray(2 * piece + 1)) : length;
    }

    /** What that glass loses, where its fiber has a loss at the wavelength. */
    Optional<Loss> findLoss(int piece, boolean cutAtStart, boolean cutAtEnd) {
        return over(piece, glass(piece, cutAtStart, cutAtEnd));
    }

    private Optional<Loss> over(int piece, Length length) {
        return values.findLoss(lay(network.blockOf(piece).owner()).cable(), wavelength)
                .map(value -> Loss.ofDecibels(length.metres() / 1000 * value.value()));
    }

    private Length sheath(int piece) {
        Block block = network.blockOf(piece);
        return sheaths.computeIfAbsent(block.firstPiece(), first -> {
            CableLay lay = lay(block.owner());
            Length from = lay.positions().enclosure(lay.index(block.fromRow()));
            return lay.glass(lay.positions()
                    .enclosure(lay.index(block.toRow()))
                    .minus(from)
                    .abs());
        });
    }

    private Length tray(int end) {
        Block block = network.blockOf(end >> 1);
        CableLay lay = lay(block.owner());
        return lay.findEnclosure(lay.index((end & 1) == 0 ? block.fromRow() : block.toRow()))
                .map(Enclosure::trayGlass)
                .orElse(Length.ZERO);
    }
}
