package spanwright.repair;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.SheathPlace;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.RecordsView;
import spanwright.records.Refusal;

/**
 * Where along its run a cable is cut and the piece let in: from one row to a later one, each with a structure for an
 * enclosure, and no enclosure of the cable between them.
 */
final class RepairSite {

    private final RecordsView records;
    private final RepairOrder order;
    private final List<Refusal> refusals = new ArrayList<>();
    private @Nullable CableLay lay;
    private Length cut = Length.ZERO;
    private int first;
    private int second;

    RepairSite(RecordsView records, RepairOrder order) {
        this.records = records;
        this.order = order;
        Optional<Cable> cable = records.cables().find(order.cable());
        if (cable.isEmpty()) {
            refuse("repair-no-cable", "cable", "There is no cable " + order.cable() + "; name the reel that was cut.");
        } else {
            CableLay found = CableLay.of(records, cable.get().id());
            lay = found;
            askRows(found);
        }
    }

    private void refuse(String code, String column, String sentence) {
        refusals.add(new Refusal(code, sentence, column, null, null));
    }

    /** Why no piece can be let in so; empty where it can. */
    List<Refusal> refusals() {
        return refusals;
    }

    /** How the cable lies before the repair; only where nothing is refused. */
    CableLay lay() {
        CableLay known = lay;
        if (known == null) {
            throw new IllegalStateException("no cable " + order.cable());
        }
        return known;
    }

    /** The sheath position of the cut; of a span that is named, its middle. */
    Length cut() {
        return cut;
    }

    /** The row at which the part toward the start ends. */
    int first() {
        return first;
    }

    /** The row at which the part toward the end begins. */
    int second() {
        return second;
    }

    private void askRows(CableLay found) {
        int row = cutRow(found);
        if (row < 1) {
            return;
        }
        cut = order.at() == null ? middle(found, row) : order.at();
        first = nearest(found, order.first().structure(), row - 1, -1);
        second = nearest(found, order.second().structure(), row, 1);
        int last = found.rows().size() - 1;
        askEnd(order.first().structure(), first, first >= 1, "first", "before");
        askEnd(order.second().structure(), second, second >= 0 && second < last, "second", "after");
        if (refusals.isEmpty()) {
            askBetween(found);
            askPiece(found);
            askCoils(found);
        }
    }

    private static Length middle(CableLay found, int row) {
        long out = found.positions().out(row - 1).micrometres();
        return new Length((out + found.positions().in(row).micrometres()) / 2);
    }

    /** The row to which the span leads on which the cable was cut; 0 where it is not known. */
    private int cutRow(CableLay found) {
        Length at = order.at();
        if (at != null) {
            if (at.compareTo(Length.ZERO) < 0 || at.compareTo(found.positions().length()) > 0) {
                refuse(
                        "repair-off-cable",
                        "at_m",
                        "The sheath of " + order.cable() + " is "
                                + found.positions().length() + " long; " + at + " is not on it.");
                return 0;
            }
            SheathPlace place = found.positions().place(at);
            if (place.onSpan()) {
                return place.row();
            }
            refuse(
                    "repair-in-structure",
                    "at_m",
                    "At " + at + " the sheath lies at "
                            + found.structure(place.row()).code() + "; give a position on a span, or the span.");
            return 0;
        }
        for (int row = 1; row < found.rows().size(); row++) {
            Integer span = found.rows().get(row).span();
            if (span != null && records.spans().get(span).code().equals(order.span())) {
                return row;
            }
        }
        refuse("repair-not-on-span", "span", order.cable() + " does not lie on the span " + order.span() + ".");
        return 0;
    }

    private static int nearest(CableLay found, String structure, int from, int step) {
        for (int row = from; row >= 0 && row < found.rows().size(); row += step) {
            if (found.structure(row).code().equals(structure)) {
                return row;
            }
        }
        return -1;
    }

    private void askEnd(String structure, int row, boolean within, String column, String side) {
        if (row < 0) {
            refuse(
                    "repair-not-visited",
                    column,
                    order.cable() + " does not visit " + structure + " " + side
                            + " the cut; name a structure that it does.");
        } else if (!within) {
            refuse(
                    "repair-at-end",
                    column,
                    order.cable() + " begins or ends at " + structure + ": lay a new cable to there instead.");
        }
    }

    private void askBetween(CableLay found) {
        for (int row = first; row <= second; row++) {
            int runRow = found.rows().get(row).id();
            String structure = found.structure(row).code();
            records.findPassAt(runRow)
                    .ifPresent(pass -> refuse(
                            "repair-over-enclosure",
                            "first",
                            order.cable() + " is in "
                                    + records.enclosures().get(pass.enclosure()).code() + " at " + structure
                                    + "; let the piece in between enclosures, beside it."));
        }
    }

    private void askPiece(CableLay found) {
        int fibers = found.type().fibers();
        Optional<CableType> type = pieceType();
        if (type.isEmpty()) {
            refuse(
                    "repair-no-type",
                    "piece",
                    "There is no cable type " + order.piece().cableType() + ".");
        } else if (type.get().fibers() < fibers) {
            refuse(
                    "repair-too-few-fibers",
                    "piece",
                    "The piece has " + type.get().fibers() + " fibers, " + order.cable() + " has " + fibers
                            + "; name a type with as many.");
        }
        Length length = order.piece().length();
        if (length != null && length.compareTo(route()) < 0) {
            refuse(
                    "repair-too-short",
                    "piece",
                    "The piece is " + length + " long, its route " + route() + "; give its length along the sheath.");
        }
    }

    private void askCoils(CableLay found) {
        boolean one = order.first().structure().equals(order.second().structure());
        if (one && !order.slack().isEmpty()) {
            refuse(
                    "repair-slack",
                    "slack",
                    "Both enclosures are at " + order.first().structure()
                            + ", so it is not said which coil is meant; correct the run's coils by themselves.");
            return;
        }
        for (RepairOrder.Coil coil : order.slack()) {
            int before = nearest(found, coil.structure(), first, -1);
            int row = before >= 0 ? before : nearest(found, coil.structure(), second, 1);
            if (row < 0 || found.positions().coil(row).compareTo(coil.left()) < 0) {
                refuse(
                        "repair-slack",
                        "slack",
                        "No coil of " + order.cable() + " at " + coil.structure() + " holds " + coil.left()
                                + " or more outside the piece's route.");
            } else if (row != first && row != second) {
                refuse(
                        "repair-slack",
                        "slack",
                        "Slack is drawn from the coils beside the piece: at "
                                + order.first().structure() + " and "
                                + order.second().structure() + ".");
            }
        }
    }

    /** The type of the piece. */
    Optional<CableType> pieceType() {
        String code = order.piece().cableType();
        return code == null ? Optional.of(lay().type()) : records.cableTypes().find(code);
    }

    /** The route that the piece takes. */
    Length route() {
        return lay().routeTo(second).minus(lay().routeTo(first));
    }

    /** The sheath of the piece. */
    Length pieceLength() {
        return Objects.requireNonNullElse(order.piece().length(), route());
    }

    /** Whether sheath was drawn from the coil at a row. */
    boolean drawn(int row) {
        return !left(row).equals(lay().positions().coil(row));
    }

    /** What is left of the coil at a row, as the repair has it. */
    Length left(int row) {
        String structure = lay().structure(row).code();
        return order.slack().stream()
                .filter(coil -> coil.structure().equals(structure))
                .findFirst()
                .map(RepairOrder.Coil::left)
                .orElse(lay().positions().coil(row));
    }
}
