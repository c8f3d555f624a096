package spanwright.exchange;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.quantity.Wavelength;

/** Rows of {@code circuits.csv}. */
final class CircuitRows extends Rows<Circuit> {

    private static final int CIRCUIT = Table.CIRCUITS.column("circuit");
    private static final int SERVICE = Table.CIRCUITS.column("service");
    private static final int CUSTOMER = Table.CIRCUITS.column("customer");
    private static final int PRIORITY = Table.CIRCUITS.column("priority");
    private static final int CUSTOMERS_SERVED = Table.CIRCUITS.column("customers_served");
    private static final int WAVELENGTH = Table.CIRCUITS.column("wavelength_nm");
    private static final int BUDGET = Table.CIRCUITS.column("budget");
    private static final int PROTECTION_GROUP = Table.CIRCUITS.column("protection_group");
    private static final int A = Table.CIRCUITS.column("a");
    private static final int Z = Table.CIRCUITS.column("z");
    private static final int STATUS = Table.CIRCUITS.column("status");
    private static final int USUAL_PRIORITY = 3;
    private static final int MOST_CUSTOMERS = 100_000_000;
    private static final Wavelength USUAL_WAVELENGTH = Wavelength.ofNanometres(1310);
    private static final List<String> CLASSES = List.of("A", "B", "B+", "C", "C+", "N1", "N2", "E1", "E2");

    private final Ports ports;

    CircuitRows(References refs, Ports ports) {
        super(Table.CIRCUITS, RecordKind.CIRCUIT, refs);
        this.ports = ports;
    }

    @Override
    @Nullable
    Circuit read(Row row, int id) {
        String code = row.code(CIRCUIT);
        String service = row.free(SERVICE);
        String customer = row.free(CUSTOMER);
        Integer priority = row.whole(PRIORITY, 1, 5);
        Integer customers = row.whole(CUSTOMERS_SERVED, 0, MOST_CUSTOMERS);
        List<Wavelength> wavelengths = wavelengths(row);
        String budget = budget(row);
        String protectionGroup = row.code(PROTECTION_GROUP);
        Ports.Found a = ports.find(row, A);
        Ports.Found z = ports.find(row, Z);
        CircuitStatus status = row.word(STATUS, CircuitStatus.values(), CircuitStatus::word);
        if (code == null || a == null || z == null || !sameCount(row, a, z)) {
            return null;
        }
        return new Circuit(
                id,
                code,
                service,
                customer,
                Objects.requireNonNullElse(priority, USUAL_PRIORITY),
                Objects.requireNonNullElse(customers, 1),
                wavelengths,
                budget,
                protectionGroup,
                new PortRange(a.panel().id(), a.numbers()),
                new PortRange(z.panel().id(), z.numbers()),
                Objects.requireNonNullElse(status, CircuitStatus.WORKING));
    }

    private static boolean sameCount(Row row, Ports.Found a, Ports.Found z) {
        if (a.numbers().count() == z.numbers().count()) {
            return true;
        }
        row.fault(
                Z,
                row.named(A) + " has " + a.numbers().count() + " and " + row.named(Z) + " has "
                        + z.numbers().count() + "; a circuit has the same count on both sides, joined in order");
        return false;
    }

    private static List<Wavelength> wavelengths(Row row) {
        if (row.blank(WAVELENGTH)) {
            return List.of(USUAL_WAVELENGTH);
        }
        List<Wavelength> wavelengths = new ArrayList<>();
        int begin = row.from(WAVELENGTH);
        for (int at = begin; at <= row.to(WAVELENGTH); at++) {
            if (at == row.to(WAVELENGTH) || row.chars()[at] == ' ') {
                Wavelength wavelength = row.nanometres(WAVELENGTH, begin, at);
                if (wavelength == null) {
                    return List.of(USUAL_WAVELENGTH);
                }
                wavelengths.add(wavelength);
                begin = at + 1;
            }
        }
        return wavelengths;
    }

    private static @Nullable String budget(Row row) {
        String text = row.free(BUDGET);
        if (text == null || CLASSES.contains(text)) {
            return text;
        }
        if (Decimals.plain(row.chars(), row.from(BUDGET), row.to(BUDGET))) {
            BigDecimal number = new BigDecimal(text);
            if (number.signum() >= 0) {
                return Decimals.shortest(number).toPlainString();
            }
        }
        row.fault(
                BUDGET,
                row.named(BUDGET) + " is no budget; write a class, one of " + String.join(", ", CLASSES)
                        + ", or a number of dB of 0 or above");
        return null;
    }

    @Override
    void write(Circuit circuit, Cells cells) {
        cells.put(CIRCUIT, circuit.code());
        cells.put(SERVICE, circuit.service());
        cells.put(CUSTOMER, circuit.customer());
        cells.put(PRIORITY, circuit.priority());
        cells.put(CUSTOMERS_SERVED, circuit.customersServed());
        cells.put(
                WAVELENGTH,
                circuit.wavelengths().stream()
                        .map(wavelength -> wavelength.exactNanometres().toPlainString())
                        .collect(Collectors.joining(" ")));
        cells.put(BUDGET, circuit.budget());
        cells.put(PROTECTION_GROUP, circuit.protectionGroup());
        cells.put(A, ports.text(circuit.a().panel(), circuit.a().ports()));
        cells.put(Z, ports.text(circuit.z().panel(), circuit.z().ports()));
        cells.put(STATUS, circuit.status().word());
    }
}
