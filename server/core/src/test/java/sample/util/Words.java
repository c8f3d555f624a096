package sample.util;

/** A fair name in a package without meaning. */
public final class Words {}
