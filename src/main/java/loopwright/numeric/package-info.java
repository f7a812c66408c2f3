/**
 * Linear algebra, Newton's method, eigenvalues, root search, least squares and integration; knows
 * no electronics. The only package that imports EJML. May import {@code quantity} and {@code task}.
 */
package loopwright.numeric;
