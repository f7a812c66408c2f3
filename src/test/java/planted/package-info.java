/**
 * A small house in which each rule of the house is broken once, so that the architecture test can
 * show that its rules see.
 */
package planted;
