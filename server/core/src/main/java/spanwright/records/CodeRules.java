package spanwright.records;

import spanwright.journal.Recorded;

/** Codes are unique within their kind; a panel's and a splitter's within their enclosure. */
final class CodeRules {

    private CodeRules() {}

    static void ask(RecordsView view, Recorded record, Refusals refusals) {
        String code = Codes.of(record);
        if (code == null) {
            return;
        }
        int holder = view.identity(record.kind(), code);
        if (holder != 0 && holder != record.id()) {
            String plain = code.substring(code.indexOf('/') + 1);
            refusals.add(
                    "code-twice",
                    Names.codeColumn(record.kind()),
                    "'" + plain + "' is there already; a code is used once",
                    view.record(record.kind(), holder));
        }
    }
}
