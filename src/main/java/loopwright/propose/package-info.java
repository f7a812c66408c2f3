/**
 * First designs from a specification, each value with its reason and the whole checked by the
 * program's own prediction before it is offered; and which part trims an offset or a gain. Imports
 * what stands before it up to {@code check}.
 */
package loopwright.propose;
