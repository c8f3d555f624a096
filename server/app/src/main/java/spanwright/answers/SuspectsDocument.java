package spanwright.answers;

import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.splicing.Joint;
import spanwright.suspicion.Suspect;
import spanwright.suspicion.Suspects;

/** The document of what explains an outage. */
public final class SuspectsDocument {

    private static final double SCORE_STEP = 1e4;

    private final View view;
    private final Suspects suspects;
    private final StretchDocument stretches;

    /** Of an answer. */
    public SuspectsDocument(View view, Suspects suspects) {
        this.view = view;
        this.suspects = suspects;
        this.stretches = new StretchDocument(view.records());
    }

    /** Writes its members. */
    public void write(Json json) {
        json.list("suspects", suspects.list(), this::suspect);
        json.whole("total", suspects.total());
        json.object(
                "together",
                item -> item.wholes("suspects", suspects.together()).number("score", rounded(suspects.score())));
        json.whole("posting", view.posting());
    }

    private void suspect(Json json, Suspect suspect) {
        Span span = suspect.span();
        Enclosure enclosure = suspect.enclosure();
        if (span != null) {
            json.text("span", span.code());
        }
        if (enclosure != null) {
            json.text("enclosure", enclosure.code());
        }
        json.texts("spans", suspect.spans().stream().map(Span::code).toList());
        json.texts(
                "enclosures", suspect.enclosures().stream().map(Enclosure::code).toList());
        json.metres("route_m", suspect.route());
        json.whole("explains", suspect.explains().size())
                .whole("contradicts", suspect.contradicts().size());
        json.number("score", rounded(suspect.score()))
                .text("kind", suspect.kind().word());
        json.texts("tubes", suspect.tubes()).texts("ports", suspect.ports());
        json.texts("explained", codes(suspect.explains())).texts("contradicted", codes(suspect.contradicts()));
        json.list("rests_on", suspect.restsOn(), this::joint);
        stretches.write(json, suspect);
    }

    private static List<String> codes(List<Circuit> circuits) {
        return circuits.stream().map(Circuit::code).toList();
    }

    private void joint(Json json, Joint joint) {
        json.text("enclosure", view.enclosure(joint.enclosure()));
        json.text("a", view.names().ends(joint.a())).text("b", view.names().ends(joint.b()));
        json.text("trust", joint.facts().trust().word());
    }

    private static Double rounded(double score) {
        return Math.rint(score * SCORE_STEP) / SCORE_STEP;
    }
}
