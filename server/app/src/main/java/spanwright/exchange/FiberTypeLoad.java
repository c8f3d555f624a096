package spanwright.exchange;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberType;

/** Enters {@code fiber_types.csv}: all rows of a type make one record, which takes the place of one of that name. */
final class FiberTypeLoad implements TableLoad {

    private final Entering entering;
    private final Map<String, FiberTypeRows.Gathered> byCode = new LinkedHashMap<>();

    FiberTypeLoad(Entering entering) {
        this.entering = entering;
    }

    @Override
    public void enter(Row row) {
        String code = row.code(FiberTypeRows.TYPE);
        FiberTypeRows.Gathered gathered = code == null
                ? new FiberTypeRows.Gathered()
                : byCode.computeIfAbsent(code, any -> new FiberTypeRows.Gathered());
        gathered.take(row);
    }

    @Override
    public void end() {
        byCode.forEach((code, gathered) -> {
            if (gathered.inDoubt()) {
                entering.doubts().add(Table.FIBER_TYPES, code);
                return;
            }
            Optional<FiberType> held = entering.view().fiberTypes().find(code);
            int id = held.map(FiberType::id).orElse(entering.view().limit(RecordKind.FIBER_TYPE));
            FiberType type = gathered.type(id, code);
            if (held.isEmpty()) {
                entering.add(Table.FIBER_TYPES, gathered.firstLine(), type);
            } else if (!type.equals(held.get())) {
                entering.apply(Table.FIBER_TYPES, gathered.firstLine(), Change.replace(held.get(), type));
            }
        });
    }
}
