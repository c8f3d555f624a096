package spanwright.sheet;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import spanwright.sheet.PastedColumns.Part;

/** Reads one row of a pasted block by way of the line that says the same. */
final class PastedRow {

    private final EnclosureLegs legs;
    private final PastedColumns columns;
    private final List<String> cells;
    private final int number;
    private final List<CellDoubt> doubts;

    PastedRow(EnclosureLegs legs, PastedColumns columns, List<String> cells, int number, List<CellDoubt> doubts) {
        this.legs = legs;
        this.columns = columns;
        this.cells = cells;
        this.number = number;
        this.doubts = doubts;
    }

    /** The joint that a row says; nothing, and a doubt, where a cell is not understood. */
    Optional<Statement.Joins> read(LineReader reader) {
        int before = doubts.size();
        String a = side(0);
        String b = side(1);
        if (doubts.size() > before) {
            return Optional.empty();
        }
        try {
            LineSaid said = reader.read(number, a + " = " + b);
            if (said instanceof LineSaid.Whole whole
                    && whole.statements().size() == 1
                    && whole.statements().get(0) instanceof Statement.Joins joins) {
                return Optional.of(joins);
            }
            doubt(0, Part.CABLE, "Name a cable and a fiber on each side.");
        } catch (MistakeFound found) {
            Mistake mistake = found.mistake();
            int side = mistake.place().column() > a.length() ? 1 : 0;
            doubt(side, partOf(mistake), mistake.text() + " " + mistake.mend());
        }
        return Optional.empty();
    }

    private static Part partOf(Mistake mistake) {
        return switch (mistake.code()) {
            case "no-such-leg" -> Part.CABLE;
            case "direction-missing" -> Part.DIRECTION;
            default -> Part.FIBER;
        };
    }

    private String cell(int side, Part part) {
        return columns.find(side, part)
                .filter(at -> at < cells.size())
                .map(cells::get)
                .orElse("");
    }

    private String side(int side) {
        String cable = cell(side, Part.CABLE);
        List<CableLeg> known = legs.of(cable);
        if (known.isEmpty()) {
            doubt(side, Part.CABLE, "Name a cable that is here: " + legs.words() + ".");
            return "";
        }
        String direction = cell(side, Part.DIRECTION).toLowerCase(Locale.ROOT);
        if (direction.isEmpty() && known.size() == 1) {
            direction = known.get(0).name().substring(cable.length() + 1);
        }
        String wanted = direction;
        if (known.stream().noneMatch(leg -> leg.name().equals(cable + " " + wanted))) {
            doubt(side, Part.DIRECTION, "Say back or ahead: " + legs.words() + ".");
            return "";
        }
        String tube = cell(side, Part.TUBE);
        return cable + " " + direction + (tube.isEmpty() ? " " : " tube " + tube + " ") + cell(side, Part.FIBER);
    }

    private void doubt(int side, Part part, String mend) {
        int at = columns.find(side, part)
                .or(() -> columns.find(side, Part.CABLE))
                .orElse(0);
        doubts.add(new CellDoubt(number, at + 1, at < cells.size() ? cells.get(at) : "", mend));
    }
}
