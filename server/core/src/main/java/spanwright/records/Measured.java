package spanwright.records;

import java.util.function.Predicate;
import java.util.stream.Stream;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.splicing.Measurement;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * Finds the measurements that name a record: they say in words what they are of, an end {@code F-1 ahead 3 @ E4}, a
 * fiber {@code F-1:3} or a port {@code E9/P/4}.
 */
final class Measured {

    private Measured() {}

    /** What the measurements are of that name a record; nothing for kinds that none names. */
    static Stream<String> list(RecordsView view, Recorded record) {
        Predicate<String> names = names(view, record);
        return view.measurements().list().map(Measurement::what).filter(names);
    }

    private static Predicate<String> names(RecordsView view, Recorded record) {
        return switch (record.kind()) {
            case CABLE ->
                what -> begins(what, ((Cable) record).code(), ':') || begins(what, ((Cable) record).code(), ' ');
            case ENCLOSURE ->
                what -> begins(what, ((Enclosure) record).code(), '/')
                        || what.endsWith(at(((Enclosure) record).code()));
            case PASS -> end(Names.cable(view, ((Pass) record).cable()), view, ((Pass) record).enclosure());
            case SPLITTER -> end(((Splitter) record).code(), view, ((Splitter) record).enclosure());
            case PANEL -> {
                Panel panel = (Panel) record;
                String port = Names.enclosure(view, panel.enclosure()) + "/" + panel.code();
                yield what -> begins(what, port, '/');
            }
            default -> what -> false;
        };
    }

    private static Predicate<String> end(String code, RecordsView view, int enclosure) {
        String at = at(Names.enclosure(view, enclosure));
        return what -> begins(what, code, ' ') && what.endsWith(at);
    }

    private static String at(String enclosure) {
        return " @ " + enclosure;
    }

    private static boolean begins(String what, String code, char after) {
        return what.length() > code.length() && what.charAt(code.length()) == after && what.startsWith(code);
    }
}
