package spanwright.exchange;

import java.time.ZoneId;
import java.time.ZoneOffset;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.RecordsView;

/**
 * What rows may refer to: all that has been entered before, by this folder or long ago.
 *
 * <p>Codes found are remembered, so nothing may be renamed or removed while one of these is in use.
 */
final class References extends Codes {

    private final Doubts doubts;
    private @Nullable ZoneId zone;

    final Known<Structure> structures;
    final Known<Span> spans;
    final Known<CableType> cableTypes;
    final Known<Cable> cables;
    final Known<Enclosure> enclosures;

    References(RecordsView view, Doubts doubts) {
        super(view);
        this.doubts = doubts;
        structures = new Known<>(view.structures(), Table.STRUCTURES, "structure", Structure::code, doubts);
        spans = new Known<>(view.spans(), Table.SPANS, "span", Span::code, doubts);
        cableTypes = new Known<>(view.cableTypes(), Table.CABLE_TYPES, "cable type", CableType::code, doubts);
        cables = new Known<>(view.cables(), Table.CABLES, "cable", Cable::code, doubts);
        enclosures = new Known<>(view.enclosures(), Table.ENCLOSURES, "enclosure", Enclosure::code, doubts);
    }

    Doubts doubts() {
        return doubts;
    }

    /** The type of a cable. */
    CableType typeOf(int cable) {
        return view().cableTypes().get(view().cables().get(cable).cableType());
    }

    /** The records' own zone; UTC where no setting says otherwise. */
    ZoneId zone() {
        ZoneId known = zone;
        if (known == null) {
            known = view().settings()
                    .find("time_zone")
                    .map(found -> ZoneId.of(found.value()))
                    .orElse(ZoneOffset.UTC);
            zone = known;
        }
        return known;
    }
}
