package spanwright.exchange;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/** The texts of one row to be written, by column; numbers are exact and without exponents. */
final class Cells {

    private final Table table;
    private final String[] texts;

    Cells(Table table) {
        this.table = table;
        this.texts = new String[table.columns().size()];
        clear();
    }

    /** Blanks every cell. */
    void clear() {
        Arrays.fill(texts, "");
    }

    /** Writes a value as its own text; null leaves the cell blank. */
    void put(int column, @Nullable Object value) {
        texts[column] = value == null ? "" : value.toString();
    }

    /** Writes a length in metres. */
    void put(int column, @Nullable Length length) {
        texts[column] = length == null ? "" : length.exactMetres().toPlainString();
    }

    /** Writes a loss in dB. */
    void put(int column, @Nullable Loss loss) {
        texts[column] = loss == null ? "" : loss.exactDecibels().toPlainString();
    }

    /** Writes a decimal number. */
    void put(int column, @Nullable BigDecimal number) {
        texts[column] = number == null ? "" : number.toPlainString();
    }

    /** Writes a floating-point number with as few digits as name it. */
    void put(int column, @Nullable Double number) {
        texts[column] = number == null ? "" : plain(number);
    }

    /** Writes several, parted by spaces. */
    void put(int column, List<String> words) {
        texts[column] = String.join(" ", words);
    }

    /** Writes several ranges, parted by commas. */
    void ranges(int column, List<?> ranges) {
        texts[column] = ranges.stream().map(Object::toString).collect(Collectors.joining(","));
    }

    /** The cells in order of the columns; not to be changed. */
    String[] texts() {
        return texts;
    }

    /** The cells that are not blank, by column. */
    Map<String, String> byColumn() {
        Map<String, String> map = new LinkedHashMap<>();
        for (int column = 0; column < texts.length; column++) {
            if (!texts[column].isEmpty()) {
                map.put(table.columns().get(column), texts[column]);
            }
        }
        return map;
    }

    /** A floating-point number as a plain decimal that reads as the same number again. */
    static String plain(double number) {
        return Decimals.shortest(new BigDecimal(Double.toString(number))).toPlainString();
    }
}
