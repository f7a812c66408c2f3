/**
 * Datasheet and tester figures into the parameters of the device equations, and back again. May
 * import {@code quantity}, {@code part}, {@code numeric} and {@code circuit}; the physics itself
 * stands in {@code circuit} and nowhere else.
 */
package loopwright.characterise;
