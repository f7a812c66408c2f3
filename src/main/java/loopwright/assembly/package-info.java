/**
 * From a design and a hookup to a circuit: one class for each stage, each kind of current source,
 * and each part of a hookup. May import {@code quantity}, {@code task}, {@code part}, {@code
 * design}, {@code numeric}, {@code circuit} and {@code characterise}.
 */
package loopwright.assembly;
