package spanwright.http;

import spanwright.answers.Changes;
import spanwright.answers.RowTexts;
import spanwright.answers.Views;
import spanwright.draft.DraftDesk;
import spanwright.incident.IncidentDesk;

/**
 * What the routes answer from.
 *
 * @param views the records, now and as of and as if
 * @param finder by which posting a record was last changed
 * @param rows writes records as rows
 * @param desk takes postings
 * @param incidents the incidents of the outage desk
 * @param drafts the sheets of the records desk
 * @param version version of the program
 * @param demo whether these are the records of the demo
 */
public record Api(
        Views views,
        Changes.Finder finder,
        RowTexts rows,
        PostingDesk desk,
        IncidentDesk incidents,
        DraftDesk drafts,
        String version,
        boolean demo) {}
