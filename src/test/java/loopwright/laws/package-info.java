/**
 * Laws that must hold for any design of the stage library, tried on random ones with fixed seeds,
 * against independent means: the format's own words, other libraries, difference quotients, the
 * argument principle.
 */
package loopwright.laws;
