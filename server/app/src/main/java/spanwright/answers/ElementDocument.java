package spanwright.answers;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.loss.ElementLoss;
import spanwright.plant.Enclosure;
import spanwright.plant.LengthBasis;
import spanwright.plant.SheathPositions;
import spanwright.plant.SheathTie;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Relation;
import spanwright.splicing.FiberCount;
import spanwright.splicing.JointFacts;
import spanwright.splicing.Measurement;
import spanwright.trace.Connector;
import spanwright.trace.Fiber;
import spanwright.trace.Jumper;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Through;

/** One thing that a path meets, in a trace's document. */
final class ElementDocument {

    private final View view;

    ElementDocument(View view) {
        this.view = view;
    }

    /**
     * Writes its members.
     *
     * @param before glass from the path's start to where it begins
     */
    void write(Json json, ElementLoss loss, Length before) {
        switch (loss.element().kind()) {
            case CONNECTOR -> connector(json, (Connector) loss.element());
            case SPLICE -> splice(json, (Splice) loss.element());
            case FIBER -> fiber(json, (Fiber) loss.element());
            case THROUGH -> through(json, (Through) loss.element());
            case JUMPER -> jumper(json, (Jumper) loss.element());
            case SPLITTER -> splitter(json, (SplitterCrossing) loss.element());
        }
        json.decibels("loss_db", loss.expected()).decibels("loss_limit_db", loss.limit());
        json.text("basis", loss.basis().word()).text("source", source(loss)).metres("glass_from_m", before);
    }

    private static String source(ElementLoss loss) {
        return loss.source()
                + loss.oneWay().stream().map(ElementDocument::oneWay).collect(Collectors.joining());
    }

    /** A single way is shown and not summed. */
    private static String oneWay(Measurement measurement) {
        String way = measurement.direction() == null
                ? ""
                : " " + measurement.direction().word();
        String on = measurement.on() == null ? "" : ", " + measurement.on();
        String by = measurement.by() == null ? "" : ", by " + measurement.by();
        return "; one way" + way + " measured " + measurement.loss() + on + by + ", not summed";
    }

    private static void connector(Json json, Connector connector) {
        json.text("kind", "connector").text("port", connector.name());
        json.text("enclosure", connector.enclosure().code())
                .text("structure", connector.structure().code());
        json.text("connector", connector.panel().connector());
        json.text(
                "trust",
                connector.termination() == null
                        ? null
                        : connector.termination().facts().trust().word());
    }

    private static void splice(Json json, Splice splice) {
        JointFacts facts = splice.joint().facts();
        json.text("kind", "splice").text("enclosure", splice.enclosure().code());
        json.text("structure", splice.structure().code()).text("tray", splice.pigtail() ? null : facts.tray());
        json.text("method", splice.method().word()).text("a", splice.a()).text("b", splice.b());
        json.text("trust", facts.trust().word()).date("verified_on", facts.verifiedOn());
        json.date("spliced_on", facts.splicedOn()).text("spliced_by", facts.splicedBy());
        json.date("temporary_until", facts.temporaryUntil()).text("job", facts.job());
        json.flag("pigtail", splice.pigtail());
    }

    private void fiber(Json json, Fiber fiber) {
        json.text("kind", "fiber").text("cable", fiber.cable().code()).whole("fiber", fiber.fiber());
        json.whole("tube", fiber.tube()).text("tube_color", fiber.tubeColor()).text("fiber_color", fiber.fiberColor());
        json.text("from", fiber.from().map(Enclosure::code).orElse(null));
        json.text("to", fiber.to().map(Enclosure::code).orElse(null));
        json.text("from_structure", fiber.structure().code())
                .text("to_structure", fiber.toStructure().code());
        json.text("toward", fiber.ahead() ? "ahead" : "back");
        json.metres("sheath_m", fiber.sheath()).metres("glass_m", fiber.glass()).metres("route_m", fiber.route());
        Length start = fiber.ahead() ? fiber.fromPosition() : fiber.toPosition();
        Length end = fiber.ahead() ? fiber.toPosition() : fiber.fromPosition();
        LengthBasis basis = fiber.lay().positions().basis(start, end);
        json.text("length_basis", basis.word()).text("length_source", lengthSource(fiber.lay(), basis, start, end));
        int first = Math.min(fiber.fromRow(), fiber.toRow());
        int last = Math.max(fiber.fromRow(), fiber.toRow());
        List<String> flags = view.uses().flags(fiber.cable().id(), fiber.fiber(), first, last).stream()
                .map(flag -> flag.flag().word())
                .distinct()
                .toList();
        json.texts("flags", flags).text("part_of", fiber.cable().partOf()).text("count_name", countName(fiber));
    }

    private static String lengthSource(CableLay lay, LengthBasis basis, Length start, Length end) {
        SheathPositions positions = lay.positions();
        Optional<SheathTie> before = positions.findTieBefore(start);
        Optional<SheathTie> after = positions.findTieAfter(end);
        if (basis != LengthBasis.MARKS || before.isEmpty() || after.isEmpty()) {
            return "Route lengths and coils; no sheath marks were read on both sides";
        }
        return lay.cable().marksInk() + " marks " + mark(lay, before.get()) + " and " + mark(lay, after.get());
    }

    private static String mark(CableLay lay, SheathTie tie) {
        String read = tie.readOn() == null ? "" : ", read " + tie.readOn();
        return tie.number().toPlainString() + " " + tie.unit().symbol() + " at "
                + lay.structure(tie.row()).code() + read;
    }

    private @Nullable String countName(Fiber fiber) {
        return view.records()
                .fiberCounts()
                .owned(Relation.CABLE_COUNTS, fiber.cable().id())
                .filter(count -> count.fibers().contains(fiber.fiber()))
                .findFirst()
                .map(count -> count.name() + " " + numbered(count, fiber.fiber()))
                .orElse(null);
    }

    private static int numbered(FiberCount count, int fiber) {
        return count.numbers().at(Math.abs(fiber - count.fibers().first()));
    }

    private static void through(Json json, Through through) {
        json.text("kind", "through").text("enclosure", through.enclosure().code());
        json.text("structure", through.structure().code())
                .text("cable", through.cable().code());
        json.whole("fiber", through.fiber());
    }

    private static void jumper(Json json, Jumper jumper) {
        json.text("kind", "jumper").text("a", jumper.a()).text("b", jumper.b());
        json.text("structure", jumper.structure().code()).metres("glass_m", jumper.glass());
    }

    private static void splitter(Json json, SplitterCrossing crossing) {
        json.text("kind", "splitter").text("enclosure", crossing.enclosure().code());
        json.text("structure", crossing.structure().code())
                .text("splitter", crossing.splitter().code());
        json.whole("inputs", crossing.splitter().inputs()).whole("input", crossing.input());
        json.whole("outputs", crossing.splitter().outputs()).whole("output", crossing.output());
        json.text("toward", crossing.towardOutput() ? "output" : "input");
    }
}
