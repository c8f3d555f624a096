package spanwright.check;

/**
 * One thing in the records that a person must judge.
 *
 * @param severity how much it weighs
 * @param rule stable code of the rule that found it, such as {@code marks-turn}
 * @param file the file of a records folder in which its rows stand, such as {@code sheath_marks.csv}
 * @param code the code of what it is about: a cable, an enclosure, a circuit ...
 * @param text what is found, in a sentence
 * @param mend what would mend it, in a sentence
 */
public record Finding(Severity severity, String rule, String file, String code, String text, String mend) {}
