/** The composition root. Knows every package. */
package loopwright;
