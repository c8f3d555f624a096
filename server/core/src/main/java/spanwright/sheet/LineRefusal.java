package spanwright.sheet;

import spanwright.records.Refusal;

/**
 * Why a line cannot be entered: a rule of the records is broken.
 *
 * @param place the line
 * @param refusal the rule
 */
public record LineRefusal(TextPlace place, Refusal refusal) {}
