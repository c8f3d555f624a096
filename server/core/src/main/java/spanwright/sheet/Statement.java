package spanwright.sheet;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.JointKind;

/** What one line of a sheet says, or one range of what it says. */
public sealed interface Statement {

    /** The whole of it. */
    TextPlace place();

    /** The ends it names. */
    List<EndRange> ends();

    /** The planned job to which it belongs; empty where it is in the glass. */
    String job();

    /**
     * Ends joined.
     *
     * @param place the whole line
     * @param aPlace where the a side stands
     * @param bPlace where the b side stands
     * @param type what joins; of a termination the a side is the ports
     * @param a one side
     * @param b the other side
     * @param words what else is said
     */
    record Joins(
            TextPlace place,
            TextPlace aPlace,
            TextPlace bPlace,
            JointKind type,
            EndRange a,
            EndRange b,
            JointWords words)
            implements Statement {

        @Override
        public List<EndRange> ends() {
            return List.of(a, b);
        }

        @Override
        public String job() {
            if (words.trust() != Trust.PLANNED) {
                return "";
            }
            return words.job() == null ? "planned" : words.job();
        }

        /** The same with other words. */
        public Joins saying(JointWords other) {
            return new Joins(place, aPlace, bPlace, type, a, b, other);
        }
    }

    /**
     * What became of ends that nothing joins.
     *
     * @param place the whole line
     * @param range the ends
     * @param condition what became of them
     * @param trust how sure, or null where nothing is said
     * @param seen when last seen, or null
     */
    record States(
            TextPlace place,
            EndRange range,
            EndCondition condition,
            @Nullable Trust trust,
            @Nullable LocalDate seen) implements Statement {

        @Override
        public List<EndRange> ends() {
            return List.of(range);
        }

        @Override
        public String job() {
            return "";
        }
    }

    /**
     * What is said of a cable where it comes in or leaves: toward which structure, and the sheath mark read there.
     *
     * @param place the whole line
     * @param toPlace where the structure stands, else the whole line
     * @param markPlace where the mark stands, else the whole line
     * @param leg which
     * @param toward code of the next structure, or null
     * @param mark the number printed on the sheath, or null
     * @param unit its unit, or null
     */
    record LegSeen(
            TextPlace place,
            TextPlace toPlace,
            TextPlace markPlace,
            CableLeg leg,
            @Nullable String toward,
            @Nullable BigDecimal mark,
            @Nullable LengthUnit unit)
            implements Statement {

        @Override
        public List<EndRange> ends() {
            return List.of();
        }

        @Override
        public String job() {
            return "";
        }
    }

    /**
     * The sheath that is coiled here.
     *
     * @param place the whole line
     * @param leg a leg of the cable
     * @param left what is coiled here now
     */
    record Coiled(TextPlace place, CableLeg leg, Length left) implements Statement {

        @Override
        public List<EndRange> ends() {
            return List.of();
        }

        @Override
        public String job() {
            return "";
        }
    }
}
