/**
 * The immutable design document: stages, hookups, parts, tolerances, limits, bench; its paths,
 * changes to it as values, and its validation. Component names of the records are the field names
 * of the file format. Knows no solver, no JSON and no Swing; may import {@code quantity} and {@code
 * part}.
 */
package loopwright.design;
