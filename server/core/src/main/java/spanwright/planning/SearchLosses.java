package spanwright.planning;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import spanwright.loss.GlassValues;
import spanwright.loss.PlanningLosses;
import spanwright.loss.TableValue;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/**
 * What glass and joints lose at one wavelength, in microdecibels, as a search sums them: glass by its table, joints by
 * the loss recorded with them or the planning value. What a found path loses to the last digit, each measurement
 * regarded, is reckoned of the path as if it were posted. Where a table does not reach, glass loses nothing here. One
 * thread's.
 */
final class SearchLosses {

    private final Records records;
    private final Network network;
    private final Wavelength wavelength;
    private final GlassValues glass;
    private final PlanningLosses planning;
    private final Map<Integer, Long> sections = new HashMap<>();
    /** By piece, below 0 where it was not asked yet. */
    private final long[] pieces;

    private final Map<Integer, CableLay> lays = new HashMap<>();
    private final Map<Integer, Long> joints = new HashMap<>();
    private final Map<Integer, Long> trays = new HashMap<>();
    private final long splice;
    private final long connector;
    private final long jumperPerMetre;

    SearchLosses(Snapshot snapshot, Wavelength wavelength) {
        this.records = snapshot.records();
        this.network = snapshot.network();
        this.wavelength = wavelength;
        this.pieces = new long[network.pieces()];
        Arrays.fill(pieces, -1);
        this.glass = new GlassValues(records);
        this.planning = new PlanningLosses(records);
        this.connector = planned("connector");
        this.splice = planned("splice.fusion");
        this.jumperPerMetre = Math.round(
                1e6 * glass.findJumperLoss(wavelength).map(TableValue::value).orElse(0.0) / 1000);
    }

    private long planned(String item) {
        return planning.find(item)
                .map(value -> value.expected().microdecibels())
                .orElse(0L);
    }

    /** A piece as it is joined now. */
    long piece(int piece) {
        if (pieces[piece] < 0) {
            pieces[piece] = reckon(piece);
        }
        return pieces[piece];
    }

    private long reckon(int piece) {
        Block block = network.blockOf(piece);
        return switch (block.kind()) {
            case PANEL -> connector;
            case SPLITTER -> 0;
            case SECTION ->
                sections.computeIfAbsent(block.firstPiece(), first -> section(block))
                        + (cut(2 * piece) ? tray(2 * piece) : 0)
                        + (cut(2 * piece + 1) ? tray(2 * piece + 1) : 0);
        };
    }

    private boolean cut(int end) {
        return network.peer(end) == Network.NONE || network.joint(end) != 0;
    }

    private long section(Block block) {
        CableLay lay = lay(block.owner());
        Length from = lay.positions().enclosure(lay.index(block.fromRow()));
        Length to = lay.positions().enclosure(lay.index(block.toRow()));
        return over(lay.cable(), lay.glass(to.minus(from).abs()));
    }

    /** The tray glass that a cut leaves at a fiber's end; none at the ends of others. */
    long tray(int end) {
        Block block = network.blockOf(end >> 1);
        if (block.kind() != BlockKind.SECTION) {
            return 0;
        }
        return trays.computeIfAbsent(2 * block.firstPiece() + (end & 1), side -> tray(block, (end & 1) == 0));
    }

    private long tray(Block section, boolean start) {
        CableLay lay = lay(section.owner());
        return lay.findEnclosure(lay.index(start ? section.fromRow() : section.toRow()))
                .map(enclosure -> over(lay.cable(), enclosure.trayGlass()))
                .orElse(0L);
    }

    private CableLay lay(int cable) {
        return lays.computeIfAbsent(cable, id -> CableLay.of(records, id));
    }

    private long over(Cable cable, Length length) {
        return glass.findLoss(cable, wavelength)
                .map(value -> Math.round(1e6 * length.metres() / 1000 * value.value()))
                .orElse(0L);
    }

    /** A joint as it is, never below nothing. */
    long joint(int id) {
        return id == 0
                ? 0
                : joints.computeIfAbsent(
                        id, key -> Math.max(0, joint(records.joints().get(key))));
    }

    private long joint(Joint joint) {
        if (joint.type() == JointKind.JUMPER) {
            Length length = joint.facts().jumperLength();
            return length == null ? 0 : Math.round(jumperPerMetre * length.metres());
        }
        SpliceMethod method = joint.facts().method();
        Loss measured = joint.facts().loss();
        if (method == null) {
            return 0;
        }
        return measured == null ? planned("splice." + method.word()) : measured.microdecibels();
    }

    /** A new fusion splice. */
    long splice() {
        return splice;
    }

    /** A new jumper of the usual length. */
    long jumper() {
        return jumperPerMetre * NewJoint.JUMPER_METRES;
    }
}
