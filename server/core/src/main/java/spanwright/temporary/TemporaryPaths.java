package spanwright.temporary;

import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.loss.BudgetCheck;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.planning.SpareGlass;
import spanwright.planning.SpareSearch;
import spanwright.planning.SpareWay;
import spanwright.planning.SpareWork;
import spanwright.quantity.Loss;

/**
 * Lights another way: temporary paths over spare glass for circuits that are down, keeping what is left of their own
 * glass. One thread's; made for one answer.
 */
public final class TemporaryPaths {

    private static final Comparator<LightOffer> BEST =
            Comparator.comparing(LightOffer::work).thenComparing(offer -> lossOf(offer.lit()));

    private final Snapshot snapshot;
    private final Network network;
    private final LightQuestion question;
    private final SpareGlass glass;
    private final SpareSearch search;
    private final TrialLight trial;
    private final LineBounds bounds;
    private final Set<Integer> down;

    private TemporaryPaths(Snapshot snapshot, LightQuestion question, Runnable step) {
        this.snapshot = snapshot;
        this.network = snapshot.network();
        this.question = question;
        this.glass = new SpareGlass(snapshot);
        this.search = new SpareSearch(glass, step);
        this.trial = new TrialLight(snapshot, question.margin());
        this.bounds = new LineBounds(snapshot, question.margin());
        this.down = question.down().stream().map(Circuit::id).collect(Collectors.toSet());
    }

    /** Answers a question, however long it takes. */
    public static LightAnswer find(Snapshot snapshot, LightQuestion question) {
        return find(snapshot, question, () -> {});
    }

    /**
     * Answers a question.
     *
     * @param step run every so often meanwhile; it stops the answer by what it throws
     */
    public static LightAnswer find(Snapshot snapshot, LightQuestion question, Runnable step) {
        TemporaryPaths paths = new TemporaryPaths(snapshot, question, step);
        DarkGroups dark = DarkGroups.of(paths.glass, question.down(), question.closed());
        List<Seeking> seeking = dark.groups().stream().map(paths::seek).toList();
        List<GroupLight> groups = seeking.stream().map(Seeking::light).toList();
        OfferSharing.Shared shared = new OfferSharing(network(snapshot)).share(seeking);
        return new LightAnswer(groups, dark.strays(), shared.offers(), shared.unserved(), shared.proven());
    }

    private static Network network(Snapshot snapshot) {
        return snapshot.network();
    }

    private static long lossOf(Lit lit) {
        return lit.loss() == null ? Long.MAX_VALUE : lit.loss().microdecibels();
    }

    private Seeking seek(DarkGroup group) {
        return new Seeking(group);
    }

    /** The search for one group. */
    final class Seeking {

        private final DarkGroup group;
        private final LineSearch lines;
        private final LineSearch.Terms terms;
        private final List<LightOffer> offers = new ArrayList<>();
        private final List<Refused> refused = new ArrayList<>();
        private final boolean partnered;

        Seeking(DarkGroup group) {
            this.group = group;
            ClosedPlant closed = question.closed();
            this.lines = new LineSearch(search, group, question.fromPanels(), bounds.of(group), closed.pieces());
            ClosedPlant apart = apart(closed);
            this.partnered = apart != closed;
            this.terms = new LineSearch.Terms(apart, question.verifiedOnly(), true, Set.of());
            seekOffers();
            seekRefused();
        }

        DarkGroup group() {
            return group;
        }

        GroupLight light() {
            return new GroupLight(group, offers, refused);
        }

        List<LightOffer> offers() {
            return offers;
        }

        /** The best offer beside pieces that others have taken. */
        Optional<LightOffer> beside(Set<Integer> taken) {
            return lines.find(terms.without(taken)).flatMap(this::tried).filter(this::holds);
        }

        /** Pieces that an offer takes from others: all but its own. */
        List<Integer> takes(LightOffer offer) {
            BitSet own = lines.own();
            return offer.pieces().stream().filter(piece -> !own.get(piece)).toList();
        }

        private void seekOffers() {
            for (List<SpareWay> ways : lines.list(terms, question.most())) {
                tried(ways).ifPresent(offer -> {
                    if (holds(offer)) {
                        offers.add(offer);
                    } else if (offer.lit().whole()) {
                        refused.add(overBudget(offer));
                    }
                });
            }
            offers.sort(BEST);
        }

        private Optional<LightOffer> tried(List<SpareWay> ways) {
            return trial.moves(group, ways)
                    .map(moves -> new LightOffer(group, ways, moves, trial.light(group, ways, moves)));
        }

        private boolean holds(LightOffer offer) {
            return offer.lit().whole() && offer.lit().passes();
        }

        private void seekRefused() {
            if (lines.isBounded()) {
                refuse(Refused.Why.OVER_BUDGET, () -> lines.find(terms.unbounded()));
            }
            if (question.verifiedOnly()) {
                refuse(Refused.Why.UNVERIFIED, () -> lines.find(terms.unverified()));
                if (offers.isEmpty() && refused.isEmpty()) {
                    refuse(
                            Refused.Why.OVER_BUDGET,
                            () -> lines.find(terms.unverified().unbounded()));
                }
            }
            if (partnered) {
                refuse(Refused.Why.PARTNER, () -> lines.find(terms.around(question.closed())));
            }
            ClosedPlant hit = new ClosedPlant(snapshot);
            group.lines()
                    .forEach(line -> line.pieces(network).stream()
                            .filter(question.closed().pieces()::get)
                            .forEach(hit::piece));
            refuse(Refused.Why.SUSPECT, () -> lines.find(terms.around(hit)));
            if (offers.isEmpty() && refused.isEmpty()) {
                refused.add(new Refused(
                        Refused.Why.NO_SPARE_GLASS,
                        "no " + (question.verifiedOnly() ? "verified " : "") + "spare glass leads there",
                        List.of(),
                        null));
            }
        }

        /** Shows a path that the terms refuse, where it would be less work than what they allow. */
        private void refuse(Refused.Why why, Supplier<Optional<List<SpareWay>>> found) {
            found.get()
                    .filter(ways -> offers.isEmpty()
                            || work(ways).compareTo(offers.get(0).work()) < 0)
                    .filter(ways ->
                            refused.stream().noneMatch(other -> other.ways().equals(ways)))
                    .flatMap(this::tried)
                    .filter(offer -> offer.lit().whole())
                    .ifPresent(offer -> {
                        if (!offer.lit().passes()) {
                            refused.add(overBudget(offer));
                        } else if (why != Refused.Why.OVER_BUDGET) {
                            refused.add(new Refused(why, text(why, offer), offer.ways(), offer.lit()));
                        }
                    });
        }

        private SpareWork work(List<SpareWay> ways) {
            return ways.stream().map(SpareWay::work).reduce(SpareWork.NONE, SpareWork::plus);
        }

        private Refused overBudget(LightOffer offer) {
            BudgetCheck check = offer.lit().check();
            String over = check == null ? "" : " by " + excess(check);
            return new Refused(
                    Refused.Why.OVER_BUDGET,
                    offer.lit().worst().code() + " would be over its budget" + over,
                    offer.ways(),
                    offer.lit());
        }

        /** By how much, to a hundredth of a dB: rounded up, since it is over however little. */
        private String excess(BudgetCheck check) {
            Loss over = check.expected().minus(check.budget().max()).plus(check.margin());
            return over.exactDecibels().setScale(2, RoundingMode.UP).toPlainString() + " dB";
        }

        private String text(Refused.Why why, LightOffer offer) {
            return switch (why) {
                case PARTNER -> "it lies along the path of a circuit that protects";
                case UNVERIFIED -> "it takes spare glass that is not verified: " + unverified(offer);
                default -> "it passes a place to avoid on " + cables(offer);
            };
        }

        private String unverified(LightOffer offer) {
            return cables(takes(offer).stream()
                    .filter(piece -> !glass.isVerified(piece))
                    .toList());
        }

        private String cables(LightOffer offer) {
            return cables(offer.pieces().stream()
                    .filter(question.closed().pieces()::get)
                    .toList());
        }

        private String cables(List<Integer> pieces) {
            return pieces.stream()
                    .map(network::blockOf)
                    .filter(block -> block.kind() == BlockKind.SECTION)
                    .map(block -> snapshot.records().cables().get(block.owner()).code())
                    .distinct()
                    .sorted()
                    .collect(Collectors.joining(", "));
        }

        /** What is closed, and the paths of the circuits that protect this group's, but for the ends of its own. */
        private ClosedPlant apart(ClosedPlant closed) {
            List<Circuit> partners = snapshot.records()
                    .circuits()
                    .list()
                    .filter(other -> other.status() == CircuitStatus.WORKING && !down.contains(other.id()))
                    .filter(other -> group.circuits().stream()
                            .anyMatch(circuit -> circuit.protectionGroup() != null
                                    && circuit.protectionGroup().equals(other.protectionGroup())))
                    .toList();
            if (partners.isEmpty()) {
                return closed;
            }
            Set<Integer> ends = new HashSet<>();
            group.lines().forEach(line -> {
                ends.add(glass.structure(glass.enclosure(line.from() & ~1)));
                ends.add(glass.structure(glass.enclosure(line.to() & ~1)));
            });
            ClosedPlant apart = closed.copy();
            for (Circuit partner : partners) {
                for (int fiber = 0; fiber < partner.fibers(); fiber++) {
                    DarkLine.of(network, partner, fiber).forEach(line -> apart.along(line, ends));
                }
            }
            return apart;
        }
    }
}
