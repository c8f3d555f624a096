package spanwright.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.stream.IntStream;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.records.RecordsView;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;

/** Works out what the rest of a leg is: every fiber that no other line of the sheet names. */
final class RestOfLegs {

    private final RecordsView records;
    private final NamedEnds named;
    private final EnclosureLegs legs;

    RestOfLegs(RecordsView records, EnclosureLegs legs, NamedEnds named) {
        this.records = records;
        this.legs = legs;
        this.named = named;
    }

    /** The statements of a line that speaks of the rest. */
    List<Statement> expand(LineSaid said) throws MistakeFound {
        if (said instanceof LineSaid.RestThrough through) {
            return through(through);
        }
        LineSaid.Rest rest = (LineSaid.Rest) said;
        SaidSide other = rest.b();
        return other == null ? inState(rest) : straight(rest, other);
    }

    private List<Statement> inState(LineSaid.Rest rest) throws MistakeFound {
        CableLeg leg = Objects.requireNonNull(rest.a().cable());
        EndCondition condition = Objects.requireNonNull(rest.condition());
        List<Statement> statements = new ArrayList<>();
        for (FiberRange range : named.unnamed(leg)) {
            statements.add(new Statement.States(
                    rest.place(),
                    new EndRange(leg.leg(), range),
                    condition,
                    rest.words().trust(),
                    rest.words().seen()));
        }
        refuseNone(statements, rest.place(), leg);
        return statements;
    }

    private List<Statement> straight(LineSaid.Rest rest, SaidSide other) throws MistakeFound {
        CableLeg a = Objects.requireNonNull(rest.a().cable());
        CableLeg b = Objects.requireNonNull(other.cable());
        List<FiberRange> ofA = named.unnamed(a);
        List<FiberRange> ofB = named.unnamed(b);
        if (!ofA.equals(ofB)) {
            throw new MistakeFound(
                    rest.place(),
                    "rest-unlike",
                    "What is left of " + a.name() + " is " + words(ofA) + ", of " + b.name() + " " + words(ofB)
                            + ", so they do not join number to number.",
                    "Say first what becomes of the fibers that the other has not: what they join, capped or stored.");
        }
        List<Statement> statements = new ArrayList<>();
        for (FiberRange range : ofA) {
            statements.add(new Statement.Joins(
                    rest.place(),
                    rest.a().place(),
                    other.place(),
                    JointKind.SPLICE,
                    new EndRange(a.leg(), range),
                    new EndRange(b.leg(), range),
                    rest.words()));
        }
        refuseNone(statements, rest.place(), a);
        return statements;
    }

    private static String words(List<FiberRange> ranges) {
        return ranges.isEmpty()
                ? "nothing"
                : String.join(", ", ranges.stream().map(FiberRange::toString).toList());
    }

    private List<Statement> through(LineSaid.RestThrough rest) throws MistakeFound {
        Set<Integer> opened = openedTubes(rest.back(), rest.ahead());
        IntStream left = IntStream.rangeClosed(1, rest.back().type().fibers())
                .filter(fiber -> opened.contains(rest.back().type().tubeOf(fiber)))
                .filter(fiber -> !named.has(rest.back().leg(), fiber)
                        && !named.has(rest.ahead().leg(), fiber));
        List<Statement> statements = new ArrayList<>();
        for (FiberRange range : FiberRange.listOf(left)) {
            for (Leg leg : List.of(rest.back().leg(), rest.ahead().leg())) {
                statements.add(new Statement.States(
                        rest.place(),
                        new EndRange(leg, range),
                        EndCondition.THROUGH,
                        rest.words().trust(),
                        rest.words().seen()));
            }
        }
        refuseNone(statements, rest.place(), rest.back());
        return statements;
    }

    /** The tubes that the records say are opened here, and those of which another line names a fiber. */
    private Set<Integer> openedTubes(CableLeg back, CableLeg ahead) {
        Set<Integer> tubes = new HashSet<>();
        records.findPassAt(back.row().id())
                .map(Pass::tubesOpened)
                .ifPresent(ranges -> ranges.forEach(
                        range -> IntStream.range(0, range.count()).forEach(index -> tubes.add(range.at(index)))));
        for (CableLeg leg : List.of(back, ahead)) {
            IntStream.rangeClosed(1, leg.type().fibers())
                    .filter(fiber -> named.has(leg.leg(), fiber))
                    .forEach(fiber -> tubes.add(leg.type().tubeOf(fiber)));
        }
        return tubes;
    }

    private void refuseNone(List<Statement> statements, TextPlace place, CableLeg leg) throws MistakeFound {
        if (statements.isEmpty()) {
            throw new MistakeFound(
                    place,
                    "rest-of-nothing",
                    "Nothing is left of " + leg.cable().code() + " in " + legs.code() + ".",
                    "Leave the line out; for a tube that is not opened nothing need be said.");
        }
    }
}
