package spanwright.sqlite.rows;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.quantity.Wavelength;
import spanwright.splicing.Direction;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Measurement;
import spanwright.splicing.PlanningValue;

/** The layouts of what is said of the fibers: measurements, flags, counts, circuits and planning values. */
final class ServiceLayouts {

    private static final Vocabulary<Direction> DIRECTIONS = Vocabulary.of(Direction.values(), Direction::word);
    private static final Vocabulary<Flag> FLAGS = Vocabulary.of(Flag.values(), Flag::word);
    private static final Vocabulary<CircuitStatus> STATUSES =
            Vocabulary.of(CircuitStatus.values(), CircuitStatus::word);

    private ServiceLayouts() {}

    static List<Layout> list() {
        return List.of(measurement(), fiberFlag(), fiberCount(), circuit(), planningValue());
    }

    private static void writeRange(FiberRange range, RowSink to) {
        to.integer(range.first());
        to.integer(range.last());
    }

    private static FiberRange readRange(RowSource from) {
        return new FiberRange(from.number(), from.number());
    }

    private static Layout measurement() {
        return Layout.of(
                RecordKind.MEASUREMENT,
                Measurement.class,
                (measurement, to) -> {
                    Direction direction = measurement.direction();
                    to.text(measurement.what());
                    to.integer(measurement.wavelength().picometres());
                    to.wordIfAny(direction == null ? null : direction.word());
                    to.integer(measurement.loss().microdecibels());
                    to.dateIfAny(measurement.on());
                    to.textIfAny(measurement.by());
                    to.textIfAny(measurement.file());
                },
                from -> new Measurement(
                        from.number(),
                        from.text(),
                        new Wavelength(from.integer()),
                        readDirection(from),
                        from.loss(),
                        from.dateIfAny(),
                        from.textIfAny(),
                        from.textIfAny()),
                "what TEXT",
                "wavelength_pm INTEGER",
                "direction TEXT",
                "loss_udb INTEGER",
                "measured_on TEXT",
                "measured_by TEXT",
                "file TEXT");
    }

    private static @Nullable Direction readDirection(RowSource from) {
        return from.passNone() ? null : DIRECTIONS.value(from.text());
    }

    private static Layout fiberFlag() {
        return Layout.of(
                RecordKind.FIBER_FLAG,
                FiberFlag.class,
                (flag, to) -> {
                    to.integer(flag.cable());
                    writeRange(flag.fibers(), to);
                    to.word(flag.flag().word());
                    to.integerIfAny(flag.from());
                    to.integerIfAny(flag.to());
                    to.textIfAny(flag.owner());
                    to.textIfAny(flag.reason());
                    to.dateIfAny(flag.until());
                },
                from -> new FiberFlag(
                        from.number(),
                        from.number(),
                        readRange(from),
                        FLAGS.value(from.text()),
                        from.numberIfAny(),
                        from.numberIfAny(),
                        from.textIfAny(),
                        from.textIfAny(),
                        from.dateIfAny()),
                "cable INTEGER",
                "first_fiber INTEGER",
                "last_fiber INTEGER",
                "flag TEXT",
                "from_enclosure INTEGER",
                "to_enclosure INTEGER",
                "owner TEXT",
                "reason TEXT",
                "until TEXT");
    }

    private static Layout fiberCount() {
        return Layout.of(
                RecordKind.FIBER_COUNT,
                FiberCount.class,
                (count, to) -> {
                    to.integer(count.cable());
                    writeRange(count.fibers(), to);
                    to.text(count.name());
                    writeRange(count.numbers(), to);
                },
                from -> new FiberCount(from.number(), from.number(), readRange(from), from.text(), readRange(from)),
                "cable INTEGER",
                "first_fiber INTEGER",
                "last_fiber INTEGER",
                "name TEXT",
                "first_number INTEGER",
                "last_number INTEGER");
    }

    private static Layout circuit() {
        return Layout.of(
                RecordKind.CIRCUIT,
                Circuit.class,
                ServiceLayouts::writeCircuit,
                from -> new Circuit(
                        from.number(),
                        from.text(),
                        from.textIfAny(),
                        from.textIfAny(),
                        from.number(),
                        from.number(),
                        Lists.wavelengths(from.text()),
                        from.textIfAny(),
                        from.textIfAny(),
                        new PortRange(from.number(), readRange(from)),
                        new PortRange(from.number(), readRange(from)),
                        STATUSES.value(from.text())),
                "code TEXT",
                "service TEXT",
                "customer TEXT",
                "priority INTEGER",
                "customers_served INTEGER",
                "wavelengths_pm TEXT",
                "budget TEXT",
                "protection_group TEXT",
                "a_panel INTEGER",
                "a_first INTEGER",
                "a_last INTEGER",
                "z_panel INTEGER",
                "z_first INTEGER",
                "z_last INTEGER",
                "status TEXT");
    }

    private static void writeCircuit(Circuit circuit, RowSink to) {
        to.text(circuit.code());
        to.textIfAny(circuit.service());
        to.textIfAny(circuit.customer());
        to.integer(circuit.priority());
        to.integer(circuit.customersServed());
        to.text(Lists.wavelengths(circuit.wavelengths()));
        to.textIfAny(circuit.budget());
        to.textIfAny(circuit.protectionGroup());
        to.integer(circuit.a().panel());
        writeRange(circuit.a().ports(), to);
        to.integer(circuit.z().panel());
        writeRange(circuit.z().ports(), to);
        to.word(circuit.status().word());
    }

    private static Layout planningValue() {
        return Layout.of(
                RecordKind.PLANNING_VALUE,
                PlanningValue.class,
                (value, to) -> {
                    to.text(value.item());
                    to.integer(value.expected().microdecibels());
                    to.lossIfAny(value.limit());
                    to.lossIfAny(value.sd());
                    to.textIfAny(value.source());
                },
                from -> new PlanningValue(
                        from.number(), from.text(), from.loss(), from.lossIfAny(), from.lossIfAny(), from.textIfAny()),
                "item TEXT",
                "expected_udb INTEGER",
                "limit_udb INTEGER",
                "sd_udb INTEGER",
                "source TEXT");
    }
}
