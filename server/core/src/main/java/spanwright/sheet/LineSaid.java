package spanwright.sheet;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.splicing.EndCondition;

/** What one line says, before it is known what the rest is. */
sealed interface LineSaid {

    /**
     * Statements that stand by themselves; none for a blank line.
     *
     * @param statements in order
     */
    record Whole(List<Statement> statements) implements LineSaid {}

    /**
     * The rest of a leg, joined number to number to the rest of another, or in one state.
     *
     * @param place the whole line
     * @param a the leg
     * @param b the leg that its fibers join, or null where they are in a state
     * @param condition their state, or null where they are joined
     * @param words what else is said
     */
    record Rest(
            TextPlace place,
            SaidSide a,
            @Nullable SaidSide b,
            @Nullable EndCondition condition,
            JointWords words) implements LineSaid {}

    /**
     * The rest of a cable goes through, in the tubes that are opened.
     *
     * @param place the whole line
     * @param back its leg toward its start
     * @param ahead its leg toward its end
     * @param words what else is said
     */
    record RestThrough(TextPlace place, CableLeg back, CableLeg ahead, JointWords words) implements LineSaid {}
}
