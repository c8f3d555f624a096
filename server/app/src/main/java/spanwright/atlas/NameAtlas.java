package spanwright.atlas;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.Records;
import spanwright.records.Relation;

/** Finds anything by its name, whole, by its beginning, or by what is within it. Any thread may ask. */
public final class NameAtlas implements AutoCloseable {

    private static final Set<RecordKind> KINDS = kinds();

    private final Near<Map<Named, NameText>> near = new Near<>(KINDS, NameAtlas::index);

    private static Set<RecordKind> kinds() {
        Set<RecordKind> kinds = EnumSet.noneOf(RecordKind.class);
        for (Named named : Named.values()) {
            kinds.add(named.kind());
        }
        return kinds;
    }

    /** The best matches for what was typed, best first, no more than so many; none for nothing. */
    public List<Match> find(Records records, String typed, int most) {
        byte[] wanted = KeyText.bytes(KeyText.plain(typed));
        if (wanted.length == 0) {
            return List.of();
        }
        Near.Found<Map<Named, NameText>> found = near.to(records);
        Best best = new Best(most);
        for (Named named : Named.values()) {
            Changed changed = changed(records, found, named);
            found.index().getOrDefault(named, new NameText(named)).search(wanted, changed::contains, best);
            NameText own = new NameText(named);
            changed.stream().forEach(id -> add(own, records, named, records.record(named.kind(), id)));
            own.trimmed().search(wanted, id -> false, best);
        }
        return best.bestFirst();
    }

    private static Changed changed(Records records, Near.Found<Map<Named, NameText>> found, Named named) {
        Changed changed = new Changed();
        found.changed(named.kind()).stream().forEach(changed::add);
        if (named == Named.PANEL || named == Named.SPLITTER) {
            Relation relation = named == Named.PANEL ? Relation.ENCLOSURE_PANELS : Relation.ENCLOSURE_SPLITTERS;
            found.changed(RecordKind.ENCLOSURE).stream()
                    .forEach(enclosure ->
                            IntStream.of(records.owned(relation, enclosure)).forEach(changed::add));
        }
        return changed;
    }

    private static Map<Named, NameText> index(Records records) {
        Map<Named, NameText> texts = new EnumMap<>(Named.class);
        for (Named named : Named.values()) {
            NameText text = new NameText(named);
            for (int id = 0; id < records.limit(named.kind()); id++) {
                add(text, records, named, records.record(named.kind(), id));
            }
            texts.put(named, text.trimmed());
        }
        return texts;
    }

    private static void add(NameText text, Records records, Named named, @Nullable Recorded record) {
        if (record != null) {
            named.names(records, record).forEach(name -> text.add(record.id(), name));
        }
    }

    @Override
    public void close() {
        near.close();
    }
}
