package spanwright.answers;

import java.util.List;
import spanwright.check.Finding;

/** What a person must judge. */
public final class CheckDocument {

    private CheckDocument() {}

    /** Writes its members. */
    public static void write(Json json, List<Finding> findings) {
        json.list("findings", findings, (item, finding) -> {
            item.text("severity", finding.severity().word()).text("rule", finding.rule());
            item.text("file", finding.file()).text("code", finding.code());
            item.text("text", finding.text()).text("mend", finding.mend());
        });
    }
}
