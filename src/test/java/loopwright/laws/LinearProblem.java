package loopwright.laws;

import loopwright.numeric.SparsityPattern;

/**
 * One linear system that was solved, with its solution: real, or complex and then interleaved.
 *
 * @param what design, kind of matrix and of solution
 * @param pattern places of the matrix
 * @param re real parts of the matrix by slot
 * @param im imaginary parts by slot; empty when it is real
 * @param transposed whether the transposed matrix was meant
 * @param b the right-hand side
 * @param x the solution
 */
record LinearProblem(
    String what,
    SparsityPattern pattern,
    double[] re,
    double[] im,
    boolean transposed,
    double[] b,
    double[] x) {

  boolean isComplex() {
    return im.length > 0;
  }

  /** ‖Ax − b‖∞/(‖A‖∞‖x‖∞ + ‖b‖∞). */
  double residual() {
    int size = pattern.size();
    double[] restRe = new double[size];
    double[] restIm = new double[size];
    double[] rowSums = new double[size];
    for (int slot = 0; slot < pattern.slots(); slot++) {
      int row = row(slot);
      int column = column(slot);
      double ar = re[slot];
      double ai = isComplex() ? im[slot] : 0;
      restRe[row] += ar * real(x, column) - ai * imaginary(x, column);
      restIm[row] += ar * imaginary(x, column) + ai * real(x, column);
      rowSums[row] += magnitude(ar, ai);
    }
    double rest = 0;
    double norm = 0;
    for (int row = 0; row < size; row++) {
      rest = Math.max(rest, magnitude(restRe[row] - real(b, row), restIm[row] - imaginary(b, row)));
      norm = Math.max(norm, rowSums[row]);
    }
    return rest / (norm * largest(x) + largest(b));
  }

  /** Row of a slot of the matrix that was meant. */
  int row(int slot) {
    return transposed ? pattern.column(slot) : pattern.row(slot);
  }

  /** Column of a slot of the matrix that was meant. */
  int column(int slot) {
    return transposed ? pattern.row(slot) : pattern.column(slot);
  }

  /** Largest magnitude of a vector of this system. */
  double largest(double[] vector) {
    double largest = 0;
    for (int i = 0; i < pattern.size(); i++) {
      largest = Math.max(largest, magnitude(real(vector, i), imaginary(vector, i)));
    }
    return largest;
  }

  /** Least that ‖A⁻¹‖∞‖A‖∞ can be, by this one solution: ‖x‖∞‖A‖∞/‖b‖∞. */
  double leastCondition() {
    double[] sums = new double[pattern.size()];
    double norm = 0;
    for (int slot = 0; slot < pattern.slots(); slot++) {
      sums[row(slot)] += magnitude(re[slot], isComplex() ? im[slot] : 0);
      norm = Math.max(norm, sums[row(slot)]);
    }
    return norm * largest(x) / largest(b);
  }

  /**
   * The solution and the condition number to more than 30 digits; a complex system as the real one
   * of twice its size for the real and the imaginary parts.
   */
  Judgement judge() {
    int size = isComplex() ? 2 * pattern.size() : pattern.size();
    DoubleDouble matrix = new DoubleDouble(size, 2 * size + 1);
    for (int slot = 0; slot < pattern.slots(); slot++) {
      if (isComplex()) {
        int row = 2 * row(slot);
        int column = 2 * column(slot);
        matrix.add(row, column, re[slot]);
        matrix.add(row, column + 1, -im[slot]);
        matrix.add(row + 1, column, im[slot]);
        matrix.add(row + 1, column + 1, re[slot]);
      } else {
        matrix.add(row(slot), column(slot), re[slot]);
      }
    }
    for (int row = 0; row < size; row++) {
      matrix.add(row, size, b[row]);
      matrix.add(row, size + 1 + row, 1);
    }
    double norm = matrix.norm(0, size);
    matrix.reduce();
    double error = 0;
    double exact = 0;
    for (int row = 0; row < size; row++) {
      error = Math.max(error, Math.abs(x[row] - matrix.get(row, size)));
      exact = Math.max(exact, Math.abs(matrix.get(row, size)));
    }
    return new Judgement(error / exact, norm * matrix.norm(size + 1, 2 * size + 1));
  }

  /**
   * How good a solution is.
   *
   * @param error ‖x − x₀‖∞/‖x₀‖∞ with the exact solution x₀
   * @param condition ‖A‖∞‖A⁻¹‖∞
   */
  record Judgement(double error, double condition) {}

  private double real(double[] vector, int index) {
    return isComplex() ? vector[2 * index] : vector[index];
  }

  private double imaginary(double[] vector, int index) {
    return isComplex() ? vector[2 * index + 1] : 0;
  }

  /** Quicker than {@link Math#hypot}, and nothing here is near the ends of the exponent. */
  private static double magnitude(double re, double im) {
    return Math.sqrt(re * re + im * im);
  }
}
