package spanwright.draft;

import spanwright.sheet.TextPlace;

/**
 * A slip that a sheet seems to hold, or what it must be asked.
 *
 * @param place where; line 1, column 1, length 0 where it is about the sheet
 * @param weight what it asks of the person
 * @param rule stable code of the rule that found it, such as {@code ribbon-turned}
 * @param text what is found, in a sentence
 * @param mend what would mend it, in a sentence
 */
public record Slip(TextPlace place, Weight weight, String rule, String text, String mend) {

    private static final TextPlace SHEET = new TextPlace(1, 1, 0);

    static Slip error(TextPlace place, String rule, String text, String mend) {
        return new Slip(place, Weight.ERROR, rule, text, mend);
    }

    static Slip warning(TextPlace place, String rule, String text, String mend) {
        return new Slip(place, Weight.WARNING, rule, text, mend);
    }

    /** A prompt about the sheet. */
    static Slip prompt(String rule, String text, String mend) {
        return new Slip(SHEET, Weight.PROMPT, rule, text, mend);
    }

    /** Whether it is about the sheet and no line of it. */
    public boolean ofSheet() {
        return place.length() == 0 && place.equals(SHEET);
    }
}
