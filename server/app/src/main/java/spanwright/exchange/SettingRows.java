package spanwright.exchange;

import java.time.DateTimeException;
import java.time.ZoneId;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.exchange.CableTypeRows.YesNo;
import spanwright.journal.RecordKind;
import spanwright.plant.Setting;
import spanwright.quantity.LengthUnit;

/** Rows of {@code settings.csv}. */
final class SettingRows extends Rows<Setting> {

    private static final int NAME = Table.SETTINGS.column("name");
    private static final int VALUE = Table.SETTINGS.column("value");
    private static final List<String> NAMES = List.of("time_zone", "owner", "unit", "invented");

    SettingRows(References refs) {
        super(Table.SETTINGS, RecordKind.SETTING, refs);
    }

    @Override
    @Nullable
    Setting read(Row row, int id) {
        String name = row.free(NAME);
        String value = row.free(VALUE);
        if (name == null || value == null) {
            return null;
        }
        boolean right = switch (name) {
            case "time_zone" -> zone(row, value);
            case "unit" -> row.word(VALUE, LengthUnit.values(), LengthUnit::symbol) != null;
            case "invented" -> row.word(VALUE, YesNo.values(), YesNo::word) != null;
            case "owner" -> true;
            default -> {
                row.fault(
                        NAME,
                        row.named(NAME) + " is no setting; the settings are " + String.join(", ", NAMES)
                                + Near.hint(name, NAMES));
                yield false;
            }
        };
        return right ? new Setting(id, name, value) : null;
    }

    private static boolean zone(Row row, String value) {
        try {
            ZoneId zone = ZoneId.of(value);
            if (ZoneId.getAvailableZoneIds().contains(zone.getId())) {
                return true;
            }
        } catch (DateTimeException e) {
            // Said below: whatever is wrong with it, what would be right is the same.
        }
        row.fault(
                VALUE,
                row.named(VALUE) + " is no IANA time zone; write one such as America/Chicago or UTC"
                        + Near.hint(value, ZoneId.getAvailableZoneIds()));
        return false;
    }

    @Override
    void write(Setting setting, Cells cells) {
        cells.put(NAME, setting.name());
        cells.put(VALUE, setting.value());
    }
}
