package spanwright.plants;

import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.splicing.JointFacts;
import spanwright.splicing.SpliceMethod;

/** Draws what is known of joints. */
final class FactsDraw {

    private final Chance chance;

    FactsDraw(Chance chance) {
        this.chance = chance;
    }

    private Trust trust(boolean planned) {
        return planned
                ? Trust.PLANNED
                : chance.of(Trust.POSTED, Trust.POSTED, Trust.VERIFIED, Trust.REPORTED, Trust.UNKNOWN);
    }

    private @Nullable String job() {
        return chance.perhaps(70, () -> chance.of("J-1", "J-2"));
    }

    JointFacts splice(boolean planned) {
        return new JointFacts(
                chance.perhaps(60, () -> "T" + chance.between(1, 4)),
                chance.of(SpliceMethod.FUSION, SpliceMethod.FUSION, SpliceMethod.MECHANICAL),
                chance.perhaps(40, () -> chance.decibels(-0.05, 0.3)),
                trust(planned),
                chance.perhaps(30, chance::day),
                chance.perhaps(30, chance::day),
                chance.perhaps(30, () -> "Ida B."),
                chance.perhaps(5, chance::day),
                planned || chance.in(20) ? job() : null,
                null);
    }

    JointFacts termination(boolean planned, boolean splitter) {
        boolean direct = splitter || chance.in(30);
        return new JointFacts(
                null,
                direct ? null : SpliceMethod.FUSION,
                direct ? null : chance.perhaps(30, () -> chance.decibels(0, 0.3)),
                trust(planned),
                chance.perhaps(30, chance::day),
                null,
                null,
                null,
                planned ? job() : null,
                null);
    }

    JointFacts jumper() {
        return new JointFacts(null, null, null, Trust.POSTED, null, null, null, null, null, chance.metres(1, 20));
    }
}
