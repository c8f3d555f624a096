package sallowmere.glass;

import sallowmere.folder.Figures;
import sallowmere.plant.Cable;

/**
 * Ends of glass as the records write them, with how many there are.
 *
 * @param text such as {@code FDR-N-1 ahead 1-12}
 * @param count how many
 */
public record Ends(String text, int count) {

    /** Fibers of the glass that leaves toward the end of a cable's run. */
    public static Ends ahead(Cable cable, int first, int last) {
        return of(cable.code() + " ahead ", first, last);
    }

    /** Fibers of the glass that leaves toward the start of a cable's run. */
    public static Ends back(Cable cable, int first, int last) {
        return of(cable.code() + " back ", first, last);
    }

    /** The input of a splitter. */
    public static Ends input(String splitter) {
        return new Ends(splitter + " in", 1);
    }

    /** Outputs of a splitter. */
    public static Ends outputs(String splitter, int first, int last) {
        return of(splitter + " out ", first, last);
    }

    private static Ends of(String stem, int first, int last) {
        return new Ends(stem + Figures.range(first, last), Math.abs(last - first) + 1);
    }
}
