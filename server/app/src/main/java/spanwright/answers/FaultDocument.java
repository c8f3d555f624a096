package spanwright.answers;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.fault.Between;
import spanwright.fault.Cause;
import spanwright.fault.FaultPlace;
import spanwright.fault.Where;
import spanwright.plant.PrintedMark;
import spanwright.plant.Structure;
import spanwright.trace.Fiber;
import spanwright.trace.Path;

/** The document of a fault's place. */
public final class FaultDocument {

    private final FaultReply reply;

    /** Of an answer. */
    public FaultDocument(FaultReply reply) {
        this.reply = reply;
    }

    /** Writes its members. */
    public void write(Json json) {
        json.number("wavelength_nm", reply.reading().wavelength().exactNanometres());
        json.whole("posting", reply.view().posting());
        json.list("places", reply.found().places(), FaultDocument::place);
        Between between = reply.found().between();
        if (between != null) {
            json.object("between", item -> between(item, between));
        }
    }

    private static void between(Json json, Between between) {
        json.metres("glass_m", between.glass()).metres("sheath_m", between.sheath());
        json.metres("within_m", between.within()).flag("one_break", between.oneBreak());
        json.object("from", item -> place(item, between.from()));
        json.object("to", item -> place(item, between.to()));
    }

    private static void place(Json json, FaultPlace place) {
        Where where = place.where();
        json.place(where.position());
        json.text("structure_before", where.before().code())
                .text("structure_after", where.after().code());
        json.metres("beyond_before_m", where.beyondBefore()).metres("short_of_after_m", where.shortOfAfter());
        json.text("span", where.span() == null ? null : where.span().code());
        fiber(json, where);
        json.text("in_slack_at", place.findCoil().map(Structure::code).orElse(null));
        place.findNearCoil().ifPresent(coil -> json.text("may_be_in_slack_at", coil.code()));
        json.text("lies_in", where.lies().word());
        json.metres("glass_m", place.glass());
        json.metres("within_m", place.uncertainty().within());
        json.object("within", causes -> {
            for (Cause cause : Cause.values()) {
                causes.metres(cause.word(), place.uncertainty().of(cause));
            }
        });
        json.list("window", items -> place.window().line().forEach(items::positionHere));
        json.flag("past_end", place.pastEnd());
        if (place.pastEnd()) {
            json.metres("over_m", place.over());
        }
        json.text("path_end", end(place.path()));
    }

    private static @Nullable String end(Path path) {
        return path.loop() ? null : path.ends().get(1).name();
    }

    private static void fiber(Json json, Where where) {
        Fiber fiber = where.fiber();
        if (fiber == null) {
            json.none("cable").none("fiber").none("sheath_position_m").none("mark");
            return;
        }
        json.text("cable", fiber.cable().code()).whole("fiber", fiber.fiber());
        json.metres("sheath_position_m", where.sheathPosition());
        Optional<PrintedMark> mark = where.findMark();
        if (mark.isEmpty()) {
            json.none("mark");
        } else {
            json.object("mark", item -> {
                item.number("value", mark.get().number());
                item.text("unit", mark.get().unit().symbol());
                item.text("ink", fiber.cable().marksInk());
            });
        }
    }
}
