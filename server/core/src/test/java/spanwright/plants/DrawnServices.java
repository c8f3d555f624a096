package spanwright.plants;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.CableValue;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.Direction;
import spanwright.splicing.Measurement;
import spanwright.splicing.PlanningValue;

/** Draws circuits and values. */
final class DrawnServices {

    private final Board board;

    DrawnServices(Board board) {
        this.board = board;
    }

    void circuit(Words words) {
        String code = words.next();
        PortRange a = board.ports(words.next());
        PortRange z = board.ports(words.next());
        Map<String, String> options = words.options("");
        board.add(new Circuit(
                board.next(RecordKind.CIRCUIT),
                code,
                null,
                null,
                3,
                1,
                List.of(Wavelength.ofNanometres(Long.parseLong(options.getOrDefault("nm", "1310")))),
                options.get("budget"),
                null,
                a,
                z,
                options.containsKey("retired") ? CircuitStatus.RETIRED : CircuitStatus.WORKING));
    }

    void planning(Words words) {
        String item = words.next();
        Loss expected = Loss.ofDecibels(words.decimal());
        Loss limit = words.more() ? Loss.ofDecibels(words.decimal()) : null;
        Loss sd = words.more() ? Loss.ofDecibels(words.decimal()) : null;
        board.add(new PlanningValue(board.next(RecordKind.PLANNING_VALUE), item, expected, limit, sd, "own trials"));
    }

    void reel(Words words) {
        int cable = board.cableOf(words.next()).id();
        Wavelength wavelength = Wavelength.ofNanometres(words.decimal());
        String loss = words.next();
        Double index = words.more() ? Double.valueOf(words.number()) : null;
        board.add(new CableValue(
                board.next(RecordKind.CABLE_VALUE),
                cable,
                wavelength,
                index,
                loss.equals("-") ? null : Loss.ofDecibels(new BigDecimal(loss)),
                "sheet 7"));
    }

    void measured(Words words) {
        String what = words.quoted();
        Wavelength wavelength = Wavelength.ofNanometres(words.decimal());
        String direction = words.next();
        boolean said = Direction.find(direction).isPresent();
        board.add(new Measurement(
                board.next(RecordKind.MEASUREMENT),
                what,
                wavelength,
                Direction.find(direction).orElse(null),
                Loss.ofDecibels(new BigDecimal(said ? words.next() : direction)),
                null,
                null,
                null));
    }
}
