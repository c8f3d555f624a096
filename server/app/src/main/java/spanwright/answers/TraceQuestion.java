package spanwright.answers;

import java.math.BigDecimal;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Unanswerable.Kind;
import spanwright.loss.Budget;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * What is to be traced, and how it is reckoned. Exactly one of circuits, all circuits, port and fiber is asked for.
 *
 * @param circuits codes, in the order of the answer
 * @param allCircuits whether all circuits but the retired are asked for
 * @param port a port, or null
 * @param fiber a fiber, or null
 * @param wavelength the wavelength, or null: each circuit's own, else 1310 nm
 * @param budget a class code or a number of dB, or null: each circuit's own
 * @param margin kept free of the budget
 */
public record TraceQuestion(
        List<String> circuits,
        boolean allCircuits,
        @Nullable String port,
        @Nullable String fiber,
        @Nullable Wavelength wavelength,
        @Nullable Budget budget,
        Loss margin) {

    private static final BigDecimal MOST_NANOMETRES = BigDecimal.valueOf(100_000);

    /** Keeps its own copy; refuses more than one thing to trace, and none. */
    public TraceQuestion {
        circuits = List.copyOf(circuits);
        int asked =
                (circuits.isEmpty() ? 0 : 1) + (allCircuits ? 1 : 0) + (port == null ? 0 : 1) + (fiber == null ? 0 : 1);
        if (asked != 1) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    (asked == 0 ? "Nothing to trace is named" : "More than one thing to trace is named")
                            + "; name circuits, a port, or a fiber.");
        }
    }

    /** Reads a wavelength in nm. */
    public static Wavelength wavelength(BigDecimal nanometres) {
        if (nanometres.signum() <= 0 || nanometres.compareTo(MOST_NANOMETRES) > 0 || nanometres.scale() > 3) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    nanometres.toPlainString() + " is not a wavelength in nm; 1310, 1490 and 1550 are some.",
                    "wavelength");
        }
        return Wavelength.ofNanometres(nanometres);
    }

    /** Reads a budget. */
    public static Budget budget(String text) {
        return Budget.find(text)
                .orElseThrow(() -> new Unanswerable(
                        Kind.BAD_REQUEST,
                        "'" + text + "' is no budget; a budget is a number of dB or one of the classes "
                                + String.join(
                                        ", ",
                                        Budget.listClasses().stream()
                                                .map(Budget::code)
                                                .toList()) + ".",
                        "budget"));
    }

    /** Reads a margin in dB. */
    public static Loss margin(BigDecimal decibels) {
        if (decibels.signum() < 0 || decibels.compareTo(MOST_NANOMETRES) > 0) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST, decibels.toPlainString() + " is not a margin in dB; it is 0 or above.", "margin");
        }
        return Loss.ofDecibels(decibels);
    }
}
