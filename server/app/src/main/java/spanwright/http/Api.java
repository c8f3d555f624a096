package spanwright.http;

/** What the routes answer from. */
public record Api() {}
