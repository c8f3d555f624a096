package spanwright.fault;

import java.math.BigDecimal;
import java.math.MathContext;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableValue;
import spanwright.records.RecordsView;
import spanwright.trace.Fiber;

/** The group index of glass at 1550 nm on random plants, from the sentences and the table of the records folder. */
final class GlassIndexTwin {

    /** Of G.652.D and G.657.A1, and so of jumpers. */
    private static final BigDecimal STANDARD = new BigDecimal("1.4682");
    /** Of the plants' own type: on the line between 1.471 at 1310 nm and 1.472 at 1625 nm. */
    private static final BigDecimal OWN = new BigDecimal("1.471")
            .add(new BigDecimal("0.001")
                    .multiply(BigDecimal.valueOf(1550 - 1310))
                    .divide(BigDecimal.valueOf(1625 - 1310), MathContext.DECIMAL128));

    private GlassIndexTwin() {}

    /** That of a fiber: its reel's own, else its type's; of a jumper where there is no fiber. */
    static BigDecimal of(RecordsView records, @Nullable Fiber fiber) {
        if (fiber == null) {
            return STANDARD;
        }
        Cable cable = fiber.cable();
        for (CableValue value : records.cableValues().list().toList()) {
            if (value.cable() == cable.id() && value.groupIndex() != null) {
                return BigDecimal.valueOf(value.groupIndex());
            }
        }
        String type = records.cableTypes().get(cable.cableType()).fiberType();
        return type.startsWith("G.65") ? STANDARD : OWN;
    }
}
