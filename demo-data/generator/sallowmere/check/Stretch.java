package sallowmere.check;

/**
 * A piece of one fiber that light takes.
 *
 * @param cable the cable
 * @param fiber the fiber
 * @param from the run row where light enters
 * @param to the run row where it leaves, lower than the first where it goes toward the start
 */
public record Stretch(String cable, int fiber, int from, int to) {}
