package spanwright.answers;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.loss.BudgetCheck;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.planning.NewJoint;
import spanwright.planning.SpareWay;
import spanwright.planning.SpareWork;
import spanwright.plant.RunRow;
import spanwright.temporary.DarkGroup;
import spanwright.temporary.GroupLight;
import spanwright.temporary.LightAnswer;
import spanwright.temporary.LightOffer;
import spanwright.temporary.Lit;
import spanwright.temporary.Refused;

/** The document of temporary paths. */
public final class LightDocument {

    private final View view;
    private final LightRows rows;

    /**
     * Of what a view shows.
     *
     * @param texts writes records as rows
     * @param until the last day of the temporary joints, or null
     */
    public LightDocument(View view, RowTexts texts, @Nullable LocalDate until) {
        this.view = view;
        this.rows = new LightRows(view, texts, until);
    }

    /** Writes its members. */
    public void write(Json json, LightAnswer answer) {
        List<DarkGroup> order = answer.groups().stream().map(GroupLight::group).toList();
        json.whole("posting", view.posting());
        json.list("groups", answer.groups(), this::group);
        json.texts("strays", answer.strays().stream().map(Circuit::code).toList());
        json.list("assigned", answer.shared(), (item, offer) -> {
            item.whole("group", order.indexOf(offer.group()));
            item.object("offer", share -> offer(share, offer));
        });
        json.wholes("unserved", answer.unserved().stream().map(order::indexOf).toList());
        json.flag("proven", answer.proven());
    }

    private void group(Json json, GroupLight light) {
        json.texts(
                "circuits", light.group().circuits().stream().map(Circuit::code).toList());
        json.whole("priority", light.group().priority())
                .whole("customers", light.group().customers());
        json.whole("fibers", light.group().fibers());
        json.list("offers", light.offers(), this::offer);
        json.list("refused", light.refused(), this::refused);
    }

    private void offer(Json json, LightOffer offer) {
        path(json, offer.ways(), offer.lit());
        json.list(
                "moves",
                offer.moves(),
                (item, circuit) -> item.text("circuit", circuit.code())
                        .text(
                                "a",
                                view.names()
                                        .ports(circuit.a().panel(), circuit.a().ports()))
                        .text(
                                "z",
                                view.names()
                                        .ports(circuit.z().panel(), circuit.z().ports())));
        LightRows.Posting posting = rows.of(offer);
        json.list("changes", posting.changes(), LightDocument::change);
        json.list("undo", posting.undo(), LightDocument::change);
    }

    private static void change(Json json, LightRows.Change change) {
        json.text("action", change.action()).text("table", change.table());
        columns(json, "key", change.key());
        columns(json, "row", change.row());
    }

    private static void columns(Json json, String name, Map<String, String> columns) {
        if (!columns.isEmpty()) {
            json.object(name, item -> columns.forEach(item::text));
        }
    }

    private void refused(Json json, Refused refused) {
        json.text("why", refused.why().name().toLowerCase(Locale.ROOT)).text("text", refused.text());
        Lit lit = refused.lit();
        if (lit != null) {
            path(json, refused.ways(), lit);
        }
    }

    private void path(Json json, List<SpareWay> ways, Lit lit) {
        SpareWork work = ways.stream().map(SpareWay::work).reduce(SpareWork.NONE, SpareWork::plus);
        json.object(
                "work",
                item -> item.whole("visits", work.visits())
                        .whole("tubes_opened", work.tubes())
                        .whole("new_splices", work.splices())
                        .whole("patches", work.patches())
                        .whole("unverified", work.unverified()));
        json.texts(
                "structures",
                ways.stream()
                        .flatMap(way -> way.visits().stream())
                        .distinct()
                        .map(id -> view.records().structures().get(id).code())
                        .sorted(Comparator.naturalOrder())
                        .toList());
        json.texts("spans", spans(ways));
        json.list(
                "fibers",
                list -> ways.forEach(way -> list.listHere(items -> fibers(way).forEach(items::textHere))));
        List<NewJoint> joints = new ArrayList<>();
        ways.forEach(way -> joints.addAll(way.joints()));
        json.list("joints", joints, this::joint);
        json.metres("glass_m", lit.glass()).decibels("loss_db", lit.loss());
        json.text("worst", lit.worst().code());
        BudgetCheck check = lit.check();
        json.decibels("budget_db", check == null ? null : check.budget().max());
        json.decibels("left_db", check == null ? null : check.left());
        json.texts("unknown", lit.unknown());
    }

    private Set<String> spans(List<SpareWay> ways) {
        Set<String> spans = new LinkedHashSet<>();
        ways.forEach(way -> way.entered().forEach(end -> {
            Block block = view.network().blockOf(end >> 1);
            if (block.kind() == BlockKind.SECTION) {
                spans.addAll(spans(block, (end & 1) == 0));
            }
        }));
        return spans;
    }

    private List<String> spans(Block section, boolean ahead) {
        RunRow from = view.records().runRows().get(section.fromRow());
        RunRow to = view.records().runRows().get(section.toRow());
        List<String> spans = new ArrayList<>();
        for (RunRow row : view.records().runOf(section.owner())) {
            Integer span = row.span();
            if (row.seq() > from.seq() && row.seq() <= to.seq() && span != null) {
                spans.add(
                        ahead ? spans.size() : 0,
                        view.records().spans().get(span).code());
            }
        }
        return spans;
    }

    private List<String> fibers(SpareWay way) {
        List<String> fibers = new ArrayList<>();
        for (int piece : way.pieces()) {
            Block block = view.network().blockOf(piece);
            if (block.kind() == BlockKind.SECTION) {
                String fiber = view.records().cables().get(block.owner()).code() + ":" + block.number(piece);
                if (fibers.isEmpty() || !fibers.get(fibers.size() - 1).equals(fiber)) {
                    fibers.add(fiber);
                }
            }
        }
        return fibers;
    }

    private void joint(Json json, NewJoint joint) {
        json.text("kind", joint.kind().name().toLowerCase(Locale.ROOT));
        json.text(
                "enclosure", view.records().enclosures().get(joint.enclosure()).code());
        json.text("a", view.names().end(view.network().keyOf(joint.a())));
        json.text("b", view.names().end(view.network().keyOf(joint.b())));
    }
}
