/**
 * The records over HTTP: the answers of {@code schema/openapi.json}, and the pages that ask for them.
 *
 * <p>Invariants:
 *
 * <ol>
 *   <li>One place turns what went wrong into a problem document ({@link spanwright.http.Problem}); no stack trace, class
 *       name or file path leaves the program.
 *   <li>Nobody posts from another machine, and no other site's page posts or reads for the person at this one.
 *   <li>Everything is bounded: threads, waiting requests, bodies, time.
 *   <li>An answer is read from one snapshot from beginning to end.
 * </ol>
 */
@NullMarked
package spanwright.http;

import org.jspecify.annotations.NullMarked;
