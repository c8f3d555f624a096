package spanwright.sqlite.rows;

import java.math.BigDecimal;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberType;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Trust;
import spanwright.quantity.LengthUnit;
import spanwright.quantity.Wavelength;

/** The layouts of cables: their types and values, their runs, marks and passes. */
final class CableLayouts {

    static final Vocabulary<Trust> TRUSTS = Vocabulary.of(Trust.values(), Trust::word);
    private static final Vocabulary<LengthUnit> UNITS = Vocabulary.of(LengthUnit.values(), CableLayouts::word);

    private CableLayouts() {}

    private static String word(LengthUnit unit) {
        return unit.symbol();
    }

    static List<Layout> list() {
        return List.of(fiberType(), colorCode(), cableType(), cable(), cableValue(), runRow(), sheathMark(), pass());
    }

    private static Layout fiberType() {
        return Layout.of(
                RecordKind.FIBER_TYPE,
                FiberType.class,
                (type, to) -> {
                    to.text(type.code());
                    to.text(Lists.values(type.values()));
                    to.realIfAny(type.zeroDispersionNm());
                    to.realIfAny(type.dispersionSlope());
                    to.realIfAny(type.pmdPsPerSqrtKm());
                },
                from -> new FiberType(
                        from.number(),
                        from.text(),
                        Lists.values(from.text()),
                        from.realIfAny(),
                        from.realIfAny(),
                        from.realIfAny()),
                "code TEXT",
                "by_wavelength TEXT",
                "zero_dispersion_nm REAL",
                "dispersion_slope REAL",
                "pmd_ps_per_sqrt_km REAL");
    }

    private static Layout colorCode() {
        return Layout.of(
                RecordKind.COLOR_CODE,
                ColorCode.class,
                (order, to) -> {
                    to.text(order.code());
                    to.text(Lists.words(order.colors(), ';'));
                },
                from -> new ColorCode(from.number(), from.text(), Lists.words(from.text(), ';')),
                "code TEXT",
                "colors TEXT");
    }

    private static Layout cableType() {
        return Layout.of(
                RecordKind.CABLE_TYPE,
                CableType.class,
                (type, to) -> {
                    to.text(type.code());
                    to.integer(type.fibers());
                    to.integer(type.fibersPerTube());
                    to.text(type.fiberType());
                    to.real(type.overlengthPct());
                    to.flag(type.ribbon());
                    to.integerIfAny(type.fibersPerRibbon());
                    to.text(type.colors());
                },
                from -> new CableType(
                        from.number(),
                        from.text(),
                        from.number(),
                        from.number(),
                        from.text(),
                        from.real(),
                        from.flag(),
                        from.numberIfAny(),
                        from.text()),
                "code TEXT",
                "fibers INTEGER",
                "fibers_per_tube INTEGER",
                "fiber_type TEXT",
                "overlength_pct REAL",
                "ribbon INTEGER",
                "fibers_per_ribbon INTEGER",
                "colors TEXT");
    }

    private static Layout cable() {
        return Layout.of(
                RecordKind.CABLE,
                Cable.class,
                (cable, to) -> {
                    to.text(cable.code());
                    to.integer(cable.cableType());
                    to.textIfAny(cable.partOf());
                    to.text(cable.marksInk());
                    to.realIfAny(cable.overlengthPct());
                    to.textIfAny(cable.reel());
                    to.dateIfAny(cable.installedOn());
                    to.word(cable.state().word());
                    to.textIfAny(cable.note());
                },
                from -> new Cable(
                        from.number(),
                        from.text(),
                        from.number(),
                        from.textIfAny(),
                        from.text(),
                        from.realIfAny(),
                        from.textIfAny(),
                        from.dateIfAny(),
                        PlantLayouts.STATES.value(from.text()),
                        from.textIfAny()),
                "code TEXT",
                "cable_type INTEGER",
                "part_of TEXT",
                "marks_ink TEXT",
                "overlength_pct REAL",
                "reel TEXT",
                "installed_on TEXT",
                "state TEXT",
                "note TEXT");
    }

    private static Layout cableValue() {
        return Layout.of(
                RecordKind.CABLE_VALUE,
                CableValue.class,
                (value, to) -> {
                    to.integer(value.cable());
                    to.integer(value.wavelength().picometres());
                    to.realIfAny(value.groupIndex());
                    to.lossIfAny(value.lossPerKm());
                    to.textIfAny(value.source());
                },
                from -> new CableValue(
                        from.number(),
                        from.number(),
                        new Wavelength(from.integer()),
                        from.realIfAny(),
                        from.lossIfAny(),
                        from.textIfAny()),
                "cable INTEGER",
                "wavelength_pm INTEGER",
                "group_index REAL",
                "loss_udb_per_km INTEGER",
                "source TEXT");
    }

    private static Layout runRow() {
        return Layout.of(
                RecordKind.RUN_ROW,
                RunRow.class,
                (row, to) -> {
                    to.integer(row.cable());
                    to.integer(row.seq());
                    to.integer(row.structure());
                    to.integerIfAny(row.span());
                    to.integer(row.slack().micrometres());
                    to.word(row.slackTrust().word());
                    to.dateIfAny(row.slackOn());
                    to.textIfAny(row.duct());
                },
                from -> new RunRow(
                        from.number(),
                        from.number(),
                        from.number(),
                        from.number(),
                        from.numberIfAny(),
                        from.length(),
                        TRUSTS.value(from.text()),
                        from.dateIfAny(),
                        from.textIfAny()),
                "cable INTEGER",
                "seq INTEGER",
                "structure INTEGER",
                "span INTEGER",
                "slack_um INTEGER",
                "slack_trust TEXT",
                "slack_on TEXT",
                "duct TEXT");
    }

    private static Layout sheathMark() {
        return Layout.of(
                RecordKind.SHEATH_MARK,
                SheathMark.class,
                (mark, to) -> {
                    to.integer(mark.runRow());
                    to.text(mark.ink());
                    to.word(word(mark.unit()));
                    to.textIfAny(printed(mark.markIn()));
                    to.textIfAny(printed(mark.markOut()));
                    to.dateIfAny(mark.readOn());
                    to.word(mark.trust().word());
                },
                from -> new SheathMark(
                        from.number(),
                        from.number(),
                        from.text(),
                        UNITS.value(from.text()),
                        from.passNone() ? null : new BigDecimal(from.text()),
                        from.passNone() ? null : new BigDecimal(from.text()),
                        from.dateIfAny(),
                        TRUSTS.value(from.text())),
                "run_row INTEGER",
                "ink TEXT",
                "unit TEXT",
                "mark_in TEXT",
                "mark_out TEXT",
                "read_on TEXT",
                "trust TEXT");
    }

    private static @Nullable String printed(@Nullable BigDecimal mark) {
        return Objects.toString(mark, null);
    }

    private static Layout pass() {
        return Layout.of(
                RecordKind.PASS,
                Pass.class,
                (pass, to) -> {
                    to.integer(pass.enclosure());
                    to.integer(pass.cable());
                    to.integer(pass.runRow());
                    to.text(Lists.ranges(pass.opened()));
                    to.text(Lists.ranges(pass.tubesOpened()));
                },
                from -> new Pass(
                        from.number(),
                        from.number(),
                        from.number(),
                        from.number(),
                        Lists.ranges(from.text()),
                        Lists.ranges(from.text())),
                "enclosure INTEGER",
                "cable INTEGER",
                "run_row INTEGER",
                "opened TEXT",
                "tubes_opened TEXT");
    }
}
