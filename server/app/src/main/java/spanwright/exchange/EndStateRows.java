package spanwright.exchange;

import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Trust;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;

/** Rows of {@code end_states.csv}. */
final class EndStateRows extends Rows<EndState> {

    private static final int ENCLOSURE = Table.END_STATES.column("enclosure");
    private static final int END = Table.END_STATES.column("end");
    private static final int STATE = Table.END_STATES.column("state");
    private static final int TRUST = Table.END_STATES.column("trust");
    private static final int VERIFIED_ON = Table.END_STATES.column("verified_on");

    private final Ends ends;

    EndStateRows(References refs, Ends ends) {
        super(Table.END_STATES, RecordKind.END_STATE, refs);
        this.ends = ends;
    }

    @Override
    @Nullable
    EndState read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        EndRange end = ends.find(row, END, enclosure);
        EndCondition state = row.word(STATE, EndCondition.values(), EndCondition::word);
        Trust trust = row.word(TRUST, Trust.values(), Trust::word);
        LocalDate verifiedOn = row.date(VERIFIED_ON, refs.zone());
        return end == null || state == null
                ? null
                : new EndState(id, enclosure, end, state, Objects.requireNonNullElse(trust, Trust.POSTED), verifiedOn);
    }

    @Override
    void write(EndState state, Cells cells) {
        cells.put(ENCLOSURE, refs.enclosure(state.enclosure()));
        cells.put(END, ends.text(state.ends()));
        cells.put(STATE, state.condition().word());
        cells.put(TRUST, state.trust().word());
        cells.put(VERIFIED_ON, state.verifiedOn());
    }
}
