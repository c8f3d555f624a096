package spanwright.answers;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;
import spanwright.plant.Line;
import spanwright.plant.Position;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.suspicion.Suspect;

/** Where a suspect lies: between which two structures, and its spans and enclosures on the map. */
final class StretchDocument {

    private final Records records;

    StretchDocument(Records records) {
        this.records = records;
    }

    /** Writes the members {@code ends}, {@code lines} and {@code places}. */
    void write(Json json, Suspect suspect) {
        json.list("ends", ends(suspect.spans()), this::end);
        json.list(
                "lines",
                items -> lines(suspect.spans())
                        .forEach(line -> items.listHere(here -> line.forEach(here::positionHere))));
        json.list(
                "places",
                items -> suspect.enclosures()
                        .forEach(enclosure -> items.positionHere(
                                structure(enclosure.structure()).position())));
    }

    /** The two structures at the ends of spans that lie in order along the route; none where there are no spans. */
    private List<Structure> ends(List<Span> spans) {
        if (spans.isEmpty()) {
            return List.of();
        }
        int last = spans.size() - 1;
        Span first = spans.get(0);
        if (last == 0) {
            return List.of(structure(first.from()), structure(first.to()));
        }
        return List.of(outer(first, spans.get(1)), outer(spans.get(last), spans.get(last - 1)));
    }

    /** The structure of a span that its neighbour does not share. */
    private Structure outer(Span span, Span neighbour) {
        boolean shared = neighbour.from() == span.from() || neighbour.to() == span.from();
        return structure(shared ? span.to() : span.from());
    }

    private void end(Json item, Structure structure) {
        Optional<String> enclosure = records.enclosures()
                .owned(Relation.STRUCTURE_ENCLOSURES, structure.id())
                .map(Enclosure::code)
                .min(String::compareTo);
        item.text("structure", structure.code()).text("enclosure", enclosure.orElse(null));
    }

    private Stream<List<Position>> lines(List<Span> spans) {
        return spans.stream().map(this::line).filter(Objects::nonNull);
    }

    private @Nullable List<Position> line(Span span) {
        Line line = span.line();
        if (line != null) {
            return line.positions();
        }
        return span.from() == span.to()
                ? null
                : List.of(
                        structure(span.from()).position(), structure(span.to()).position());
    }

    private Structure structure(int id) {
        return Objects.requireNonNull(records.structures().get(id));
    }
}
