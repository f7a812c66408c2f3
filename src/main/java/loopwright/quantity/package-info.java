/**
 * SI values as people write them: units, prefixes, the letter code, preferred values and
 * engineering format. Imports nothing of the project.
 */
package loopwright.quantity;
