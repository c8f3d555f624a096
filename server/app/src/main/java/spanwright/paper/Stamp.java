package spanwright.paper;

import java.time.Instant;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import spanwright.answers.View;
import spanwright.answers.Views;

/**
 * What every page says of where it comes from.
 *
 * @param owner whose records they are; empty where the records do not say
 * @param records as of which posting they were read, and when that was posted
 * @param printed when the page was made
 */
public record Stamp(String owner, String records, String printed) {

    private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm xxx", Locale.ROOT);

    /** Of a view's records, printed at a time. */
    public static Stamp of(Views views, View view, Instant printedAt) {
        String posted = views.ledger()
                .findPosting(view.posting())
                .map(posting -> ", posted " + TIME.format(posting.at().atZone(view.zone())))
                .orElse("");
        String owner = view.setting("owner");
        String job = view.job() == null ? "" : ", as if job " + view.job() + " were built";
        return new Stamp(
                owner == null ? "" : owner,
                "Records as of posting " + view.posting() + posted + job,
                "Printed " + TIME.format(printedAt.atZone(view.zone())));
    }
}
