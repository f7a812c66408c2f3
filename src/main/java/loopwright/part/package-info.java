/**
 * Part records: what is known of a transistor or diode, as data, and the shelf that holds them. May
 * import {@code quantity}.
 */
package loopwright.part;
