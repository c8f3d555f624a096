package spanwright.answers;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.loss.GlassValues;
import spanwright.loss.LossBasis;
import spanwright.loss.PlanningLoss;
import spanwright.loss.PlanningLosses;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.Joint;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** What joints and splitters are reckoned at, seen by themselves: no wavelength is asked for and no path walked. */
final class Losses {

    /** Where nothing is lost. */
    static final Known NOTHING = new Known(Loss.ZERO, LossBasis.NONE.word(), "Nothing is lost here");

    /** A jumper's few metres of glass lose next to nothing; this is where most circuits are read. */
    private static final Wavelength JUMPER_AT = Wavelength.ofNanometres(1310);

    private final PlanningLosses planning;
    private final GlassValues glass;

    Losses(View view) {
        this.planning = new PlanningLosses(view.records());
        this.glass = new GlassValues(view.records());
    }

    /** What each joint of a range is reckoned at. */
    Known joint(Joint joint) {
        Loss measured = joint.facts().loss();
        if (measured != null) {
            return measured(measured, "Measured, two-way mean as recorded with the joint");
        }
        SpliceMethod method = joint.facts().method();
        return switch (joint.type()) {
            case SPLICE, TERMINATION -> method == null ? NOTHING : planned("splice." + method.word());
            case JUMPER -> jumper(joint);
        };
    }

    private Known jumper(Joint joint) {
        return glass.findJumperLoss(JUMPER_AT)
                .flatMap(perKm -> Optional.ofNullable(joint.facts().jumperLength())
                        .map(length -> new Known(
                                Loss.ofDecibels(length.metres() / 1000 * perKm.value()),
                                perKm.basis().word(),
                                perKm.source())))
                .orElse(NOTHING);
    }

    /** What a splitter is reckoned at from its input to an output. */
    Known splitter(Splitter splitter, int output) {
        Loss tap = splitter.outputLosses().get(output);
        if (tap != null) {
            return measured(tap, "Measured, as recorded for each output");
        }
        return splitter.loss() != null
                ? measured(splitter.loss(), "Measured, as recorded for the splitter")
                : planned("splitter." + splitter.outputs());
    }

    private static Known measured(Loss loss, String source) {
        return new Known(loss, LossBasis.MEASURED.word(), source);
    }

    private Known planned(String item) {
        return planning.find(item)
                .map(value -> new Known(value.expected(), LossBasis.PLANNING.word(), source(value)))
                .orElseGet(() -> new Known(null, LossBasis.NONE.word(), "Not known: no planning value " + item));
    }

    private static String source(PlanningLoss value) {
        return "Planning value " + value.item() + (value.replaced() ? " of these records: " : ": ") + value.source();
    }

    /**
     * A loss with where it comes from.
     *
     * @param expected the loss, or null where it is not known
     * @param basis what it rests on, as an answer writes it
     * @param source for a person
     */
    record Known(@Nullable Loss expected, String basis, String source) {}
}
