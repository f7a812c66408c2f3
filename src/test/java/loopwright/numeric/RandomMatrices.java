package loopwright.numeric;

import java.util.Random;

/** Sparse random matrices with the widely spread values that circuits have. */
final class RandomMatrices {
  /** A matrix by its pattern and the values of its real and its imaginary part. */
  record Sparse(SparsityPattern pattern, double[] g, double[] c) {
    double[][] dense(double[] values) {
      double[][] matrix = new double[pattern.size()][pattern.size()];
      for (int slot = 0; slot < pattern.slots(); slot++) {
        matrix[pattern.row(slot)][pattern.column(slot)] += values[slot];
      }
      return matrix;
    }
  }

  private RandomMatrices() {}

  /** A regular matrix: every row has its diagonal and two more places. */
  static Sparse regular(int size, Random random) {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    int[] shuffled = random.ints(0, size).limit(4L * size).toArray();
    for (int i = 0; i < size; i++) {
      builder.slot(i, i);
      builder.slot(i, shuffled[4 * i]);
      builder.slot(i, shuffled[4 * i + 1]);
      builder.slot(shuffled[4 * i + 2], i);
    }
    SparsityPattern pattern = builder.build(size);
    double[] g = new double[pattern.slots()];
    double[] c = new double[pattern.slots()];
    for (int slot = 0; slot < g.length; slot++) {
      g[slot] = random.nextGaussian() * Math.pow(10, -4 + 3 * random.nextDouble());
      c[slot] = random.nextGaussian() * 1e-12;
    }
    return new Sparse(pattern, g, c);
  }

  static double[] vector(int size, Random random) {
    return random.doubles(size, -1, 1).toArray();
  }
}
