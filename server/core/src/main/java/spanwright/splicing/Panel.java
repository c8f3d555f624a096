package spanwright.splicing;

import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * A panel of ports; a port joins its rear to its front.
 *
 * @param id lasting identity
 * @param enclosure identity of the enclosure
 * @param code unique within its enclosure
 * @param ports how many, above 0
 * @param connector the connector, such as SC/APC
 */
public record Panel(int id, int enclosure, String code, int ports, String connector) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.PANEL;
    }
}
