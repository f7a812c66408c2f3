package loopwright.session;

import loopwright.design.Design;

/**
 * A design that could not be solved at all.
 *
 * @param design the very design
 * @param hookup the hookup asked for
 * @param says why, in a sentence
 */
public record Failure(Design design, String hookup, String says) {}
