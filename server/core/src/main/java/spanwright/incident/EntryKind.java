package spanwright.incident;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** What an entry of an incident's log tells. */
public enum EntryKind {
    /** Somebody was told of the outage: it is discovered. */
    CALLED,
    /** The crew is where the damage is believed to be. */
    ON_SITE,
    /** The damage is found. */
    FOUND,
    /** The first circuit has light again. */
    FIRST_LIGHT,
    /** Every circuit of the incident has light again. */
    ALL_LIGHT,
    /** These circuits are down too. */
    CIRCUITS_DOWN,
    /** These circuits are back. */
    CIRCUITS_BACK,
    /** Users or capacity that a person states to be down from this time on, where the records cannot tell. */
    STATED,
    /** Anything worth keeping. */
    NOTE,
    /** A reading of a trace. */
    READING,
    /** The incident is over. */
    CLOSED,
    /** It is not. */
    REOPENED;

    /** How files and answers write it. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The kind of that word. */
    public static Optional<EntryKind> find(String word) {
        return Arrays.stream(values()).filter(kind -> kind.word().equals(word)).findFirst();
    }

    /** The words of all kinds. */
    public static List<String> words() {
        return Arrays.stream(values()).map(EntryKind::word).toList();
    }

    /** Whether an entry of this kind names circuits. */
    public boolean namesCircuits() {
        return this == CIRCUITS_DOWN || this == CIRCUITS_BACK;
    }

    /** Whether an entry of this kind is nothing without a text. */
    boolean needsText() {
        return this == NOTE || this == READING;
    }
}
