package spanwright.answers;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanwright.atlas.Match;
import spanwright.atlas.NameAtlas;

/** Whatever is found by what is typed: what can be read as a fiber, port, mark or coordinate first, then names. */
public final class FindDocument {

    private final View view;
    private final NameAtlas atlas;

    /** Finds in what a view shows. */
    public FindDocument(View view, NameAtlas atlas) {
        this.view = view;
        this.atlas = atlas;
    }

    /**
     * Writes its members.
     *
     * @param typed what was typed
     * @param limit how many at most
     */
    public void write(Json json, String typed, int limit) {
        String query = typed.strip();
        List<Found> read = new ArrayList<>(new WrittenPlaces(view).find(query));
        NamedPlaces named = new NamedPlaces(view);
        for (Match match : atlas.find(view.records(), query, limit + 1)) {
            read.add(named.found(match));
        }
        Set<Found> all = new LinkedHashSet<>(read);
        json.text("query", query);
        json.list("results", all.stream().limit(limit).toList(), (item, found) -> found.write(item));
        json.flag("more", all.size() > limit);
    }
}
