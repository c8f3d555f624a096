package spanwright.splicing;

import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Trust;

/**
 * A range of joints made alike: one row of splices, terminations or jumpers.
 *
 * @param id lasting identity
 * @param type what joins
 * @param enclosure identity of the enclosure; for a jumper that of its a side's panel
 * @param a one side
 * @param b the other side, of the same count, joined in order
 * @param facts what is known of it
 */
public record Joint(int id, JointKind type, int enclosure, EndRange a, EndRange b, JointFacts facts)
        implements Recorded {

    /** Refuses sides unlike in count. */
    public Joint {
        if (a.count() != b.count()) {
            throw new IllegalArgumentException("sides unlike in count: " + a.count() + " and " + b.count());
        }
    }

    @Override
    public RecordKind kind() {
        return RecordKind.JOINT;
    }

    /** How many joints the range holds. */
    public int count() {
        return a.count();
    }

    /** Whether it is planned only, so not in the glass. */
    public boolean planned() {
        return facts.trust() == Trust.PLANNED;
    }

    /** The job it belongs to where planned: {@code planned} where none is named. */
    public String plannedJob() {
        String job = facts.job();
        return job == null ? "planned" : job;
    }
}
