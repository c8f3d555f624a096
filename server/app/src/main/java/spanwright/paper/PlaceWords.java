package spanwright.paper;

import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import spanwright.answers.View;
import spanwright.plant.Cable;
import spanwright.plant.PrintedMark;
import spanwright.plant.SheathPlace;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/** Places along cables, and what is cut, in the words of a sheet. One question's. */
public final class PlaceWords {

    private static final Pattern PLACE = Pattern.compile("place:([^@]+)@(.+)");

    private final View view;

    /** In the words of a view's records. */
    public PlaceWords(View view) {
        this.view = view;
    }

    /** What is cut, in words: references that were read already. */
    public String cuts(List<String> cuts) {
        return cuts.stream().map(this::cut).collect(Collectors.joining("; "));
    }

    private String cut(String written) {
        Matcher place = PLACE.matcher(written);
        if (place.matches()) {
            Optional<Cable> cable = view.records().cables().find(place.group(1));
            return cable.map(found -> at(view.lay(found.id()), Length.ofMetres(Double.parseDouble(place.group(2)))))
                    .orElse(written);
        }
        return written.replaceFirst(":", " ");
    }

    /** A place along a cable, such as {@code FDR-S-2, 136 ft past HH-S044 toward HH-S045, mark 19784 ft white}. */
    String at(CableLay lay, Length position) {
        return lay.cable().code() + ", " + beyond(lay, position) + mark(lay, position);
    }

    private String beyond(CableLay lay, Length position) {
        SheathPlace place = lay.positions().place(position);
        if (!place.onSpan()) {
            return "at " + lay.structure(place.row()).code();
        }
        return length(place.before()) + " past "
                + lay.structure(place.row() - 1).code() + " toward "
                + lay.structure(place.row()).code();
    }

    private static String mark(CableLay lay, Length position) {
        return lay.positions()
                .findMark(position)
                .map(mark -> ", mark " + mark(mark) + " " + lay.cable().marksInk())
                .orElse("");
    }

    /** A mark as it is printed: a whole number and its unit. */
    static String mark(PrintedMark mark) {
        return mark.number().setScale(0, RoundingMode.HALF_EVEN).toPlainString() + " "
                + mark.unit().symbol();
    }

    /** A length in the unit that people read first, to a whole foot or a tenth of a meter. */
    String length(Length length) {
        int decimals = view.unit().micrometres() < 1_000_000 ? 0 : 1;
        return String.format(Locale.ROOT, "%,." + decimals + "f ", length.in(view.unit()))
                + view.unit().symbol();
    }
}
