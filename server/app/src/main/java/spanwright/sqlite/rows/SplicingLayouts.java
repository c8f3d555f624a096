package spanwright.sqlite.rows;

import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** The layouts of what joins: splitters, panels, joints and the states of ends that no joint uses. */
final class SplicingLayouts {

    private static final Vocabulary<JointKind> JOINTS = Vocabulary.of(JointKind.values(), SplicingLayouts::word);
    private static final Vocabulary<LegKind> SIDES = Vocabulary.of(LegKind.values(), SplicingLayouts::word);
    private static final Vocabulary<SpliceMethod> METHODS = Vocabulary.of(SpliceMethod.values(), SpliceMethod::word);
    private static final Vocabulary<EndCondition> CONDITIONS = Vocabulary.of(EndCondition.values(), EndCondition::word);
    private static final String[] JOINT_WORDS = words(JointKind.values());
    private static final String[] SIDE_WORDS = words(LegKind.values());

    private SplicingLayouts() {}

    static List<Layout> list() {
        return List.of(splitter(), panel(), joint(), endState());
    }

    private static String word(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT);
    }

    private static String[] words(Enum<?>[] values) {
        String[] words = new String[values.length];
        for (int index = 0; index < words.length; index++) {
            words[index] = word(values[index]);
        }
        return words;
    }

    private static Layout splitter() {
        return Layout.of(
                RecordKind.SPLITTER,
                Splitter.class,
                (splitter, to) -> {
                    to.integer(splitter.enclosure());
                    to.text(splitter.code());
                    to.integer(splitter.inputs());
                    to.integer(splitter.outputs());
                    to.lossIfAny(splitter.loss());
                    to.text(Lists.losses(splitter.outputLosses()));
                },
                from -> new Splitter(
                        from.number(),
                        from.number(),
                        from.text(),
                        from.number(),
                        from.number(),
                        from.lossIfAny(),
                        Lists.losses(from.text())),
                "enclosure INTEGER",
                "code TEXT",
                "inputs INTEGER",
                "outputs INTEGER",
                "loss_udb INTEGER",
                "output_losses TEXT");
    }

    private static Layout panel() {
        return Layout.of(
                RecordKind.PANEL,
                Panel.class,
                (panel, to) -> {
                    to.integer(panel.enclosure());
                    to.text(panel.code());
                    to.integer(panel.ports());
                    to.text(panel.connector());
                },
                from -> new Panel(from.number(), from.number(), from.text(), from.number(), from.text()),
                "enclosure INTEGER",
                "code TEXT",
                "ports INTEGER",
                "connector TEXT");
    }

    private static Layout joint() {
        return Layout.of(
                RecordKind.JOINT,
                Joint.class,
                (joint, to) -> {
                    to.word(JOINT_WORDS[joint.type().ordinal()]);
                    to.integer(joint.enclosure());
                    writeEnds(joint.a(), to);
                    writeEnds(joint.b(), to);
                    writeFacts(joint.facts(), to);
                },
                from -> new Joint(
                        from.number(),
                        JOINTS.value(from.text()),
                        from.number(),
                        readEnds(from),
                        readEnds(from),
                        readFacts(from)),
                "kind TEXT",
                "enclosure INTEGER",
                "a_side TEXT",
                "a_leg INTEGER",
                "a_first INTEGER",
                "a_last INTEGER",
                "b_side TEXT",
                "b_leg INTEGER",
                "b_first INTEGER",
                "b_last INTEGER",
                "tray TEXT",
                "method TEXT",
                "loss_udb INTEGER",
                "trust TEXT",
                "verified_on TEXT",
                "spliced_on TEXT",
                "spliced_by TEXT",
                "temporary_until TEXT",
                "job TEXT",
                "jumper_length_um INTEGER");
    }

    private static void writeEnds(EndRange ends, RowSink to) {
        to.word(SIDE_WORDS[ends.leg().kind().ordinal()]);
        to.integer(ends.leg().owner());
        to.integer(ends.numbers().first());
        to.integer(ends.numbers().last());
    }

    private static EndRange readEnds(RowSource from) {
        return new EndRange(
                new Leg(SIDES.value(from.text()), from.number()), new FiberRange(from.number(), from.number()));
    }

    private static void writeFacts(JointFacts facts, RowSink to) {
        SpliceMethod method = facts.method();
        to.textIfAny(facts.tray());
        to.wordIfAny(method == null ? null : method.word());
        to.lossIfAny(facts.loss());
        to.word(facts.trust().word());
        to.dateIfAny(facts.verifiedOn());
        to.dateIfAny(facts.splicedOn());
        to.textIfAny(facts.splicedBy());
        to.dateIfAny(facts.temporaryUntil());
        to.textIfAny(facts.job());
        to.lengthIfAny(facts.jumperLength());
    }

    private static JointFacts readFacts(RowSource from) {
        return new JointFacts(
                from.textIfAny(),
                readMethod(from),
                from.lossIfAny(),
                CableLayouts.TRUSTS.value(from.text()),
                from.dateIfAny(),
                from.dateIfAny(),
                from.textIfAny(),
                from.dateIfAny(),
                from.textIfAny(),
                from.lengthIfAny());
    }

    private static @Nullable SpliceMethod readMethod(RowSource from) {
        return from.passNone() ? null : METHODS.value(from.text());
    }

    private static Layout endState() {
        return Layout.of(
                RecordKind.END_STATE,
                EndState.class,
                (state, to) -> {
                    to.integer(state.enclosure());
                    writeEnds(state.ends(), to);
                    to.word(state.condition().word());
                    to.word(state.trust().word());
                    to.dateIfAny(state.verifiedOn());
                },
                from -> new EndState(
                        from.number(),
                        from.number(),
                        readEnds(from),
                        CONDITIONS.value(from.text()),
                        CableLayouts.TRUSTS.value(from.text()),
                        from.dateIfAny()),
                "enclosure INTEGER",
                "side TEXT",
                "leg INTEGER",
                "first_end INTEGER",
                "last_end INTEGER",
                "condition TEXT",
                "trust TEXT",
                "verified_on TEXT");
    }
}
