/**
 * The bench: what instruments say and how far it is to be believed, agreement of readings with the
 * prediction, and what readings imply. May import everything up to {@code predict}.
 */
package loopwright.bench;
