package spanwright.cli;

import java.io.PrintWriter;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import spanwright.answers.FaultReply;
import spanwright.answers.View;
import spanwright.fault.Between;
import spanwright.fault.Cause;
import spanwright.fault.FaultPlace;
import spanwright.fault.Uncertainty;
import spanwright.fault.Where;
import spanwright.plant.PrintedMark;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.trace.Fiber;

/** Places as a dispatcher says them, 100 columns wide at most, lengths in the unit that people read first. */
final class FaultTable {

    private static final int WIDTH = 100;

    private final PrintWriter out;
    private final View view;
    private final LengthUnit unit;

    FaultTable(PrintWriter out, View view) {
        this.out = out;
        this.view = view;
        this.unit = view.unit();
    }

    void print(FaultReply reply) {
        List<FaultPlace> places = reply.found().places();
        places.forEach(place -> print(place, places.size() > 1));
        Between between = reply.found().between();
        if (between != null) {
            print(between);
        }
        out.println("As of posting " + view.posting()
                + Optional.ofNullable(view.job())
                        .map(job -> ", as if " + job + " were built")
                        .orElse("") + ". Positions are records, not a locate: call before you dig.");
    }

    private void print(FaultPlace place, boolean several) {
        String toward = several && !place.path().loop()
                ? "Toward " + place.path().ends().get(1).name() + ": "
                : "";
        Output.wrapped(out, capital(toward + sentence(place)) + ".", "", WIDTH);
        Output.wrapped(out, details(place), "  ", WIDTH);
        Output.wrapped(out, "Within " + length(place.uncertainty().within()) + " for: " + causes(place), "  ", WIDTH);
        out.println();
    }

    private void print(Between between) {
        Output.wrapped(out, "From the far end: " + sentence(between.to()) + ".", "", WIDTH);
        String sheath = length(between.sheath().abs());
        String within = ", within " + length(between.within());
        String verdict;
        if (!between.oneBreak()) {
            verdict = "Between the two shots lie " + sheath + " of cable" + within
                    + ": take it as damaged, or as two breaks, until it has been seen.";
        } else if (between.sheath().micrometres() < 0) {
            verdict = "The two shots overlap by " + sheath + within + ": one break, and glass shorter than the records"
                    + " say.";
        } else {
            verdict = "The two shots lie " + sheath + " apart" + within + ": one break.";
        }
        Output.wrapped(out, verdict, "", WIDTH);
        out.println();
    }

    /** {@code Between HH-S044 and HH-S045, 136 ft past HH-S044, within 26 ft; mark 19,784 ft (white)}. */
    private String sentence(FaultPlace place) {
        String past = place.pastEnd() ? "Past the end of the path by " + length(place.over()) + "; that end is " : "";
        String near = place.findNearCoil()
                .map(coil -> "; may be inside the coil at " + coil.code())
                .orElse("");
        return past + where(place.where()) + ", within "
                + length(place.uncertainty().within()) + mark(place.where()) + near;
    }

    private String where(Where where) {
        String at = where.before().code();
        return switch (where.lies()) {
            case SPAN ->
                "between " + at + " and " + where.after().code() + ", " + length(where.beyondBefore()) + " past " + at;
            case SLACK -> {
                Length coil = where.beyondBefore().plus(where.shortOfAfter());
                yield "in the coil of " + length(coil) + " at " + at + ", " + length(where.beyondBefore())
                        + " from where it begins";
            }
            case TRAY -> "at " + at + ", in tray glass or at a joint";
            case JUMPER -> "at " + at + ", in a jumper";
            case STRUCTURE -> "at " + at;
        };
    }

    private static String mark(Where where) {
        Fiber fiber = where.fiber();
        Optional<PrintedMark> mark = where.findMark();
        if (fiber == null || mark.isEmpty()) {
            return "";
        }
        LengthUnit printed = mark.get().unit();
        String number = String.format(
                Locale.ROOT,
                printed == LengthUnit.FOOT ? "%,.0f" : "%,.1f",
                mark.get().along().in(printed));
        return "; mark " + number + " " + printed.symbol() + " ("
                + fiber.cable().marksInk() + ")";
    }

    private String details(FaultPlace place) {
        Where where = place.where();
        Fiber fiber = where.fiber();
        String cable = fiber == null
                ? ""
                : "Fiber " + fiber.cable().code() + ":" + fiber.fiber() + ", " + fiber.tubeColor() + ", "
                        + fiber.fiberColor() + ". ";
        String span = where.span() == null
                ? ""
                : "Span " + where.span().code() + ", " + length(where.shortOfAfter()) + " short of "
                        + where.after().code() + ". ";
        return cable + span + "Glass from the shot " + length(place.glass()) + ". At "
                + String.format(
                        Locale.ROOT,
                        "%.6f, %.6f",
                        where.position().lon(),
                        where.position().lat())
                + " (lon, lat).";
    }

    private String causes(FaultPlace place) {
        Uncertainty uncertainty = place.uncertainty();
        return Arrays.stream(Cause.values())
                        .filter(cause -> uncertainty.of(cause).micrometres() > 0)
                        .sorted(Comparator.comparing(uncertainty::of).reversed())
                        .map(cause -> cause.word() + " "
                                + String.format(
                                        Locale.ROOT,
                                        "%.1f",
                                        uncertainty.of(cause).in(unit)))
                        .collect(Collectors.joining(", "))
                + " " + unit.symbol() + " (one standard uncertainty each).";
    }

    /** Whole feet, or meters to a tenth: finer than any reading is. */
    private String length(Length length) {
        return String.format(Locale.ROOT, unit == LengthUnit.FOOT ? "%,.0f" : "%,.1f", length.in(unit)) + " "
                + unit.symbol();
    }

    private static String capital(String text) {
        return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
