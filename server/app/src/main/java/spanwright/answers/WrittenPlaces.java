package spanwright.answers;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.SheathPlace;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.splicing.Panel;

/** Reads what is written as a fiber, a port, a sheath mark with its cable, or a coordinate. */
final class WrittenPlaces {

    private static final Pattern FIBER = Pattern.compile("([^\\s,/:]+):([0-9]{1,7})");
    private static final Pattern PORT = Pattern.compile("([^\\s,/:]+)/([^\\s,/:]+)/([0-9]{1,7})");
    private static final Pattern MARK = Pattern.compile("([^\\s,/:]+)\\s+([0-9][0-9,]*(?:\\.[0-9]+)?)\\s*(ft|m)?");
    private static final Pattern COORDINATE = Pattern.compile(
            "([-+]?[0-9]{1,3}(?:\\.[0-9]+)?)\\s*°?\\s*([NSEWnsew])?\\s*[,;\\s]\\s*([-+]?[0-9]{1,3}(?:\\.[0-9]+)?)\\s*°?\\s*([NSEWnsew])?");

    private final View view;
    private final Records records;

    WrittenPlaces(View view) {
        this.view = view;
        this.records = view.records();
    }

    List<Found> find(String query) {
        List<Found> found = new ArrayList<>();
        fiber(query).ifPresent(found::add);
        port(query).ifPresent(found::add);
        found.addAll(marks(query));
        coordinate(query).ifPresent(found::add);
        return found;
    }

    private Optional<Found> fiber(String query) {
        Matcher written = FIBER.matcher(query);
        if (!written.matches()) {
            return Optional.empty();
        }
        int number = Integer.parseInt(written.group(2));
        return cableAnyCase(written.group(1))
                .filter(cable -> number >= 1 && number <= fibers(cable))
                .map(cable -> {
                    CableLay lay = view.lay(cable.id());
                    Colors colors = new Colors(view, lay.type());
                    String what = "fiber, tube " + lay.type().tubeOf(number) + " "
                            + colors.tube(lay.type().tubeOf(number)) + ", " + colors.fiber(number);
                    String code = view.names().fiber(cable.id(), number);
                    int last = lay.rows().size() - 1;
                    String where = lay.structure(0).code() + " to "
                            + lay.structure(last).code();
                    return new Found(
                            "fiber",
                            code,
                            what,
                            where,
                            "fiber",
                            code,
                            lay.structure(last / 2).position());
                });
    }

    private int fibers(Cable cable) {
        return records.cableTypes().get(cable.cableType()).fibers();
    }

    private Optional<Cable> cableAnyCase(String code) {
        return records.cables()
                .find(code)
                .or(() -> records.cables()
                        .list()
                        .filter(cable -> cable.code().equalsIgnoreCase(code))
                        .findFirst());
    }

    private Optional<Found> port(String query) {
        Matcher written = PORT.matcher(query);
        if (!written.matches()) {
            return Optional.empty();
        }
        int number = Integer.parseInt(written.group(3));
        return records.enclosures()
                .find(written.group(1))
                .flatMap(enclosure -> records.findPanel(enclosure.id(), written.group(2)))
                .filter(panel -> number >= 1 && number <= panel.ports())
                .map(panel -> port(panel, number));
    }

    private Found port(Panel panel, int number) {
        Enclosure enclosure = records.enclosures().get(panel.enclosure());
        String code = view.names().port(panel.id(), number);
        String where = enclosure.code() + " at " + view.structure(enclosure.structure());
        Position at = records.structures().get(enclosure.structure()).position();
        return new Found("port", code, panel.connector() + " port", where, "port", code, at);
    }

    /** A mark on a cable, or on whichever reel of a longer cable bears it. */
    private List<Found> marks(String query) {
        Matcher written = MARK.matcher(query);
        if (!written.matches()) {
            return List.of();
        }
        String code = written.group(1);
        BigDecimal number = new BigDecimal(written.group(2).replace(",", ""));
        Optional<LengthUnit> unit = Optional.ofNullable(written.group(3)).flatMap(LengthUnit::find);
        List<Found> found = new ArrayList<>();
        records.cables()
                .list()
                .filter(cable -> cable.code().equalsIgnoreCase(code) || code.equalsIgnoreCase(cable.partOf()))
                .forEach(cable -> mark(cable, number, unit).ifPresent(found::add));
        return found;
    }

    private Optional<Found> mark(Cable cable, BigDecimal number, Optional<LengthUnit> unit) {
        CableLay lay = view.lay(cable.id());
        if (lay.positions().ties().size() < 2) {
            return Optional.empty();
        }
        LengthUnit printed = lay.positions().ties().get(0).unit();
        if (unit.isPresent() && unit.get() != printed) {
            return Optional.empty();
        }
        return lay.positions().findPosition(Length.of(number, printed)).map(position -> {
            String label = cable.code() + " " + number.toPlainString() + " " + printed.symbol();
            String what = cable.marksInk() + " mark on " + cable.code();
            SheathPlace place = lay.positions().place(position);
            return new Found("mark", label, what, where(lay, place), "cable", cable.code(), at(lay, place));
        });
    }

    private String where(CableLay lay, SheathPlace place) {
        if (!place.onSpan()) {
            boolean coil = lay.positions().coil(place.row()).micrometres() > 0;
            return (coil ? "in the coil at " : "at ")
                    + lay.structure(place.row()).code();
        }
        String before = lay.structure(place.row() - 1).code();
        return length(place.before()) + " past " + before + " toward "
                + lay.structure(place.row()).code();
    }

    /** In the unit that people read first, to a whole number. */
    private String length(Length length) {
        LengthUnit unit = view.unit();
        return Math.round(length.in(unit)) + " " + unit.symbol();
    }

    private static Position at(CableLay lay, SheathPlace place) {
        return place.onSpan()
                ? lay.route(place.row()).line().at(place.fraction())
                : lay.structure(place.row()).position();
    }

    /** Latitude first, unless letters or the size of a number say otherwise. */
    private static Optional<Found> coordinate(String query) {
        Matcher written = COORDINATE.matcher(query);
        if (!written.matches()) {
            return Optional.empty();
        }
        double first = signed(written.group(1), written.group(2));
        double second = signed(written.group(3), written.group(4));
        boolean lonFirst = isEastWest(written.group(2)) || Math.abs(first) > 90;
        double lat = lonFirst ? second : first;
        double lon = lonFirst ? first : second;
        if (Math.abs(lat) > 90 || Math.abs(lon) > 180) {
            return Optional.empty();
        }
        String label = BigDecimal.valueOf(lat).toPlainString() + ", "
                + BigDecimal.valueOf(lon).toPlainString();
        return Optional.of(
                new Found("coordinate", label, "latitude, longitude", "WGS 84", "map", null, new Position(lon, lat)));
    }

    private static boolean isEastWest(@Nullable String letter) {
        return letter != null && "EWew".contains(letter);
    }

    private static double signed(String number, @Nullable String letter) {
        double value = Double.parseDouble(number);
        return letter != null && "SWsw".contains(letter) ? -Math.abs(value) : value;
    }
}
