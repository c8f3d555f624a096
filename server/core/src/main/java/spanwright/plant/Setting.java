package spanwright.plant;

import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A named setting: time_zone, owner, unit.
 *
 * @param id lasting identity
 * @param name which setting
 * @param value its value
 */
public record Setting(int id, String name, String value) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.SETTING;
    }
}
