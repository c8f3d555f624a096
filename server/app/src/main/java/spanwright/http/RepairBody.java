package spanwright.http;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.repair.RepairOrder;
import spanwright.splicing.SpliceMethod;

/**
 * The body of a repair, read strictly.
 *
 * @param by the person who posts
 * @param reason why
 * @param preview whether nothing is to be kept
 * @param order the repair
 */
record RepairBody(String by, String reason, boolean preview, RepairOrder order) {

    private static final int LONGEST_REASON = 2_000;
    private static final int MOST_COILS = 2;
    private static final BigDecimal LONGEST = BigDecimal.valueOf(1_000_000);
    private static final String ENCLOSURE = "enclosure";
    private static final String STRUCTURE = "structure";

    static RepairBody read(Context ctx, int largest) {
        Sent sent = Sent.read(
                ctx,
                largest,
                "cable",
                "at_m",
                "span",
                "by",
                "reason",
                "enclosures",
                "piece",
                "slack",
                "method",
                "spliced_by",
                "spliced_on",
                "temporary_until",
                "job",
                "preview");
        return new RepairBody(
                sent.text("by", PostingBody.LONGEST_NAME),
                sent.text("reason", LONGEST_REASON),
                sent.flag("preview"),
                order(sent));
    }

    private static RepairOrder order(Sent sent) {
        Length at = length(sent, "at_m");
        String span = sent.findCode("span");
        if ((at == null) == (span == null)) {
            throw Sent.bad("Say where the cut is: at_m along the sheath, or the span; one of the two.");
        }
        List<Sent> enclosures = sent.objects("enclosures", 2, ENCLOSURE, STRUCTURE, "tray_glass_m");
        if (enclosures.size() != 2) {
            throw Sent.bad("enclosures is a list of two: toward the cable's start, and toward its end.");
        }
        return new RepairOrder(
                sent.code("cable"),
                at,
                span,
                place(enclosures.get(0)),
                place(enclosures.get(1)),
                piece(sent),
                coils(sent),
                method(sent),
                sent.findText("spliced_by", PostingBody.LONGEST_NAME),
                sent.findDate("spliced_on"),
                sent.findDate("temporary_until"),
                sent.findText("job", PostingBody.LONGEST_NAME));
    }

    private static RepairOrder.Place place(Sent sent) {
        Length tray = length(sent, "tray_glass_m");
        return new RepairOrder.Place(sent.code(ENCLOSURE), sent.code(STRUCTURE), tray == null ? Length.ZERO : tray);
    }

    private static RepairOrder.Piece piece(Sent sent) {
        JsonNode node = sent.member("piece");
        if (node.isMissingNode()) {
            return new RepairOrder.Piece(null, null, null, null);
        }
        Sent piece = Sent.within(node, "piece", "cable", "cable_type", "reel", "length_m");
        return new RepairOrder.Piece(
                piece.findCode("cable"),
                piece.findCode("cable_type"),
                piece.findText("reel", PostingBody.LONGEST_NAME),
                length(piece, "length_m"));
    }

    private static List<RepairOrder.Coil> coils(Sent sent) {
        List<RepairOrder.Coil> coils = new ArrayList<>();
        for (Sent coil : sent.objects("slack", MOST_COILS, STRUCTURE, "left_m")) {
            Length left = length(coil, "left_m");
            if (left == null) {
                throw Sent.bad("slack[" + coils.size() + "].left_m is how much is still coiled there, in metres.");
            }
            coils.add(new RepairOrder.Coil(coil.code(STRUCTURE), left));
        }
        return coils;
    }

    private static SpliceMethod method(Sent sent) {
        String word = sent.findText("method", PostingBody.LONGEST_NAME);
        if (word == null) {
            return SpliceMethod.FUSION;
        }
        for (SpliceMethod method : SpliceMethod.values()) {
            if (method.word().equals(word)) {
                return method;
            }
        }
        throw Sent.bad("method is fusion or mechanical.");
    }

    private static @Nullable Length length(Sent sent, String name) {
        BigDecimal metres = sent.findNumber(name);
        if (metres != null && metres.compareTo(LONGEST) > 0) {
            throw Sent.bad(name + " is a length of " + LONGEST.toPlainString() + " m at most.");
        }
        return metres == null ? null : Length.ofMetres(metres);
    }
}
