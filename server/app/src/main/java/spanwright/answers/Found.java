package spanwright.answers;

import org.jspecify.annotations.Nullable;
import spanwright.plant.Position;

/**
 * Something found by what was typed.
 *
 * @param kind what it is, as an answer writes it
 * @param label what to read first
 * @param what what it is, in words
 * @param where where it is, in words
 * @param view which view opens
 * @param code on what it opens, or null for the map
 * @param position where it is on the map, or null
 */
record Found(
        String kind,
        String label,
        String what,
        String where,
        String view,
        @Nullable String code,
        @Nullable Position position) {

    void write(Json json) {
        json.text("kind", kind).text("label", label).text("what", what).text("where", where);
        json.object("target", item -> item.text("view", view).text("code", code));
        if (position == null) {
            json.none("lon").none("lat");
        } else {
            json.place(position);
        }
    }
}
