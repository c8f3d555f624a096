package spanwright.sqlite.rows;

import java.util.List;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.WKBReader;
import org.locationtech.jts.io.WKBWriter;
import spanwright.journal.RecordKind;
import spanwright.plant.BaseFeature;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.Line;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.Setting;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;

/** The layouts of where the plant lies: settings, structures, spans, enclosures, the base map. */
final class PlantLayouts {

    static final Vocabulary<PlantState> STATES = Vocabulary.of(PlantState.values(), PlantState::word);
    private static final Vocabulary<StructureKind> STRUCTURES =
            Vocabulary.of(StructureKind.values(), StructureKind::word);
    private static final Vocabulary<Placement> PLACEMENTS = Vocabulary.of(Placement.values(), Placement::word);
    private static final Vocabulary<EnclosureKind> ENCLOSURES =
            Vocabulary.of(EnclosureKind.values(), EnclosureKind::word);

    private PlantLayouts() {}

    static List<Layout> list() {
        return List.of(setting(), structure(), span(), enclosure(), baseFeature());
    }

    private static Layout setting() {
        return Layout.of(
                RecordKind.SETTING,
                Setting.class,
                (setting, to) -> {
                    to.text(setting.name());
                    to.text(setting.value());
                },
                from -> new Setting(from.number(), from.text(), from.text()),
                "name TEXT",
                "value TEXT");
    }

    private static Layout structure() {
        return Layout.of(
                RecordKind.STRUCTURE,
                Structure.class,
                (structure, to) -> {
                    to.text(structure.code());
                    to.word(structure.type().word());
                    to.real(structure.position().lon());
                    to.real(structure.position().lat());
                    to.lengthIfAny(structure.accuracy());
                    to.textIfAny(structure.address());
                    to.word(structure.state().word());
                    to.text(Lists.words(structure.sharedRisk(), ' '));
                    to.textIfAny(structure.note());
                },
                from -> new Structure(
                        from.number(),
                        from.text(),
                        STRUCTURES.value(from.text()),
                        new Position(from.real(), from.real()),
                        from.lengthIfAny(),
                        from.textIfAny(),
                        STATES.value(from.text()),
                        Lists.words(from.text(), ' '),
                        from.textIfAny()),
                "code TEXT",
                "kind TEXT",
                "lon REAL",
                "lat REAL",
                "accuracy_um INTEGER",
                "address TEXT",
                "state TEXT",
                "shared_risk TEXT",
                "note TEXT");
    }

    private static Layout span() {
        return Layout.of(
                RecordKind.SPAN,
                Span.class,
                (span, to) -> {
                    Line line = span.line();
                    to.text(span.code());
                    to.integer(span.from());
                    to.integer(span.to());
                    to.word(span.placement().word());
                    to.lengthIfAny(span.measuredLength());
                    to.textIfAny(line == null ? null : Lists.line(line));
                    to.word(span.state().word());
                    to.text(Lists.words(span.sharedRisk(), ' '));
                    to.textIfAny(span.note());
                },
                from -> new Span(
                        from.number(),
                        from.text(),
                        from.number(),
                        from.number(),
                        PLACEMENTS.value(from.text()),
                        from.lengthIfAny(),
                        from.passNone() ? null : Lists.line(from.text()),
                        STATES.value(from.text()),
                        Lists.words(from.text(), ' '),
                        from.textIfAny()),
                "code TEXT",
                "from_structure INTEGER",
                "to_structure INTEGER",
                "placement TEXT",
                "measured_length_um INTEGER",
                "line TEXT",
                "state TEXT",
                "shared_risk TEXT",
                "note TEXT");
    }

    private static Layout enclosure() {
        return Layout.of(
                RecordKind.ENCLOSURE,
                Enclosure.class,
                (enclosure, to) -> {
                    to.text(enclosure.code());
                    to.integer(enclosure.structure());
                    to.word(enclosure.type().word());
                    to.integer(enclosure.trayGlass().micrometres());
                    to.word(enclosure.state().word());
                    to.textIfAny(enclosure.note());
                },
                from -> new Enclosure(
                        from.number(),
                        from.text(),
                        from.number(),
                        ENCLOSURES.value(from.text()),
                        from.length(),
                        STATES.value(from.text()),
                        from.textIfAny()),
                "code TEXT",
                "structure INTEGER",
                "kind TEXT",
                "tray_glass_um INTEGER",
                "state TEXT",
                "note TEXT");
    }

    private static Layout baseFeature() {
        return Layout.of(
                RecordKind.BASE_FEATURE,
                BaseFeature.class,
                (feature, to) -> {
                    to.text(feature.layer());
                    to.textIfAny(feature.name());
                    to.blob(new WKBWriter().write(feature.geometry()));
                },
                from -> new BaseFeature(from.number(), from.text(), from.textIfAny(), geometry(from.blob())),
                "layer TEXT",
                "name TEXT",
                "geometry BLOB");
    }

    private static Geometry geometry(byte[] wkb) {
        try {
            return new WKBReader().read(wkb);
        } catch (ParseException fault) {
            throw new IllegalArgumentException("a geometry that is none", fault);
        }
    }
}
