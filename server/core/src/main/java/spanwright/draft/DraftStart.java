package spanwright.draft;

/**
 * How a draft begins.
 *
 * @param enclosure lasting identity of the enclosure
 * @param author who writes it, not blank
 * @param base the last posting seen
 * @param text what is written in it at first
 */
public record DraftStart(int enclosure, String author, int base, DraftText text) {}
