package sample.high;

/** A name without meaning in a fair package. */
public final class LengthHelper {}
