package loopwright.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * One analysis serves many matrices; bad pivots bring a new one; the residual stays small
 * throughout.
 */
class SystemFamilyTest {
  private static final double RESIDUAL = 1e-13;

  /** Nodal equations of a ladder of resistors with sources, whose branch rows have no diagonal. */
  private static RandomMatrices.Sparse ladder(int nodes, Random random) {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    int size = nodes + 2;
    int[][] slots = new int[nodes][3];
    for (int i = 0; i < nodes; i++) {
      slots[i][0] = builder.slot(i, i);
      if (i > 0) {
        slots[i][1] = builder.slot(i, i - 1);
        slots[i][2] = builder.slot(i - 1, i);
      }
    }
    int[] branches = {
      builder.slot(0, nodes),
      builder.slot(nodes, 0),
      builder.slot(nodes - 1, nodes + 1),
      builder.slot(nodes + 1, nodes - 1)
    };
    SparsityPattern pattern = builder.build(size);
    double[] g = new double[pattern.slots()];
    double[] c = new double[pattern.slots()];
    for (int i = 0; i < nodes; i++) {
      double toGround = Math.pow(10, -13 + 12 * random.nextDouble());
      g[slots[i][0]] += toGround;
      c[slots[i][0]] += 1e-12 * random.nextDouble();
      if (i > 0) {
        double along = Math.pow(10, -6 + 5 * random.nextDouble());
        g[slots[i][0]] += along;
        g[slots[i - 1][0]] += along;
        g[slots[i][1]] = -along;
        g[slots[i][2]] = -along;
      }
    }
    for (int branch : branches) {
      g[branch] = 1;
    }
    return new RandomMatrices.Sparse(pattern, g, c);
  }

  @ParameterizedTest
  @ValueSource(ints = {4, 30, 90, 300})
  void realResidualsStaySmallWhenValuesChangeByDecades(int nodes) {
    Random random = new Random(nodes);
    SystemFamily family = new SystemFamily(ladder(nodes, new Random(1)).pattern());
    RealSystem system = family.real();
    for (int i = 0; i < 30; i++) {
      RandomMatrices.Sparse matrix = ladder(nodes, random);
      double[] b = RandomMatrices.vector(nodes + 2, random);
      assertThat(system.factor(matrix.g())).isTrue();
      double[] x = b.clone();
      system.solve(x);
      assertThat(residual(matrix, matrix.g(), x, b)).isLessThan(RESIDUAL);
    }
    assertThat(family.denseFallbacks()).isZero();
    assertThat(family.analyses()).isGreaterThanOrEqualTo(1);
  }

  @Test
  void oneAnalysisServesEveryFrequency() {
    Random random = new Random(7);
    RandomMatrices.Sparse matrix = ladder(60, random);
    SystemFamily family = new SystemFamily(matrix.pattern());
    ComplexSystem first = family.complex();
    for (double omega = 1; omega < 1e6; omega *= 2) {
      assertThat(first.factor(matrix.g(), matrix.c(), 0, omega)).isTrue();
    }
    assertThat(family.complex().factor(matrix.g(), matrix.c(), 0, 1e3)).isTrue();
    assertThat(family.analyses()).isEqualTo(1);
    assertThat(family.multiplyAdds()).isPositive();
  }

  /** What is read often comes last in complex systems, and the solution is the same. */
  @Test
  void whatIsToBeEliminatedLastIs() {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    int size = 12;
    for (int row = 0; row < size; row++) {
      for (int column = Math.max(0, row - 1); column <= Math.min(size - 1, row + 1); column++) {
        builder.slot(row, column);
      }
    }
    SparsityPattern plain = builder.build(size);
    builder.eliminateLast(0);
    builder.eliminateLast(5);
    builder.eliminateLast(-1);
    SparsityPattern marked = builder.build(size);
    assertThat(marked.isSameAs(plain)).isFalse();
    assertThat(marked.isSameAs(builder.build(size))).isTrue();

    double[] g = new Random(1).doubles(plain.slots(), 0.5, 1).toArray();
    double[] c = new Random(2).doubles(plain.slots(), 0.5, 1).toArray();
    SystemFamily family = new SystemFamily(marked);
    ComplexSystem complex = family.complex();
    assertThat(complex.factor(g, c, 0, 1)).isTrue();
    assertThat(family.complexPlans().get(0).rowStep[0]).isGreaterThanOrEqualTo(size - 2);
    assertThat(family.complexPlans().get(0).columnStep[5]).isGreaterThanOrEqualTo(size - 2);
    ComplexSystem other = new SystemFamily(plain).complex();
    assertThat(other.factor(g, c, 0, 1)).isTrue();
    double[] x = RandomMatrices.vector(2 * size, new Random(3));
    double[] y = x.clone();
    complex.solve(x);
    other.solve(y);
    assertThat(x).containsExactly(y, within(1e-12));
  }

  @Test
  void aPivotThatVanishesBringsANewAnalysis() {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    for (int row = 0; row < 2; row++) {
      for (int column = 0; column < 2; column++) {
        builder.slot(row, column);
      }
    }
    SystemFamily family = new SystemFamily(builder.build(2));
    RealSystem system = family.real();
    assertThat(system.factor(new double[] {4, 1, 1, 3})).isTrue();
    assertThat(system.factor(new double[] {0, 1, 1, 0})).isTrue();
    double[] x = {5, 6};
    system.solve(x);
    assertThat(x).containsExactly(6, 5);
    assertThat(system.determinantSign()).isEqualTo(-1);
    assertThat(family.analyses()).isEqualTo(2);
  }

  @Test
  void whereNoOrderIsSafeTheDenseFactorisationStepsInAndIsCounted() {
    SystemFamily family = new SystemFamily(RealSystemChecks.full(3));
    assertThat(family.real().factor(new double[] {1, 2, 3, 2, 4, 6, 1, 1, 1})).isFalse();
    assertThat(family.denseFallbacks()).isEqualTo(1);
  }

  /**
   * Rows that say x₀ + xₙ = b₀ and, below, xᵢ + xₙ = bᵢ + m xᵢ₋₁: pivots on the diagonal, which a
   * small m brings about, give multipliers of m and let the last column grow by m at every step.
   */
  private static RandomMatrices.Sparse growing(int steps, double m) {
    SparsityPattern.Builder builder = new SparsityPattern.Builder();
    double[] values = new double[3 * steps + 1];
    for (int i = 0; i <= steps; i++) {
      values[builder.slot(i, i)] = 1;
      if (i > 0) {
        values[builder.slot(i, i - 1)] = -m;
      }
      values[builder.slot(i, steps)] += i < steps ? 1 : 0;
    }
    return new RandomMatrices.Sparse(builder.build(steps + 1), values, new double[values.length]);
  }

  /** What refinement can cure it cures; where so much is lost that it cannot, dense steps in. */
  @ParameterizedTest
  @CsvSource({"3, false", "8, true"})
  void aResidualBeyondRoundingIsCuredAndCounted(int steps, boolean dense) {
    RandomMatrices.Sparse gentle = growing(steps, 0.01);
    RandomMatrices.Sparse harsh = growing(steps, 7e3);
    SystemFamily family = new SystemFamily(gentle.pattern());
    RealSystem real = family.real();
    ComplexSystem complex = family.complex();
    double[] b = RandomMatrices.vector(steps + 1, new Random(3));
    double[] complexB = RandomMatrices.vector(2 * steps + 2, new Random(4));
    assertThat(real.factor(gentle.g())).isTrue();
    assertThat(complex.factor(gentle.g(), gentle.c(), 0, 1)).isTrue();
    assertThat(real.factor(harsh.g())).isTrue();
    assertThat(complex.factor(harsh.g(), harsh.c(), 0, 1)).isTrue();
    assertThat(family.analyses()).isEqualTo(2);

    double[] x = b.clone();
    real.solve(x);
    assertThat(residual(harsh, harsh.g(), x, b)).isLessThan(RESIDUAL);
    double[] complexX = complexB.clone();
    complex.solve(complexX);
    for (int part = 0; part < 2; part++) {
      assertThat(residual(harsh, harsh.g(), part(complexX, part), part(complexB, part)))
          .isLessThan(RESIDUAL);
    }
    assertThat(family.refinements()).isGreaterThanOrEqualTo(2);
    assertThat(family.denseFallbacks()).isEqualTo(dense ? 2 : 0);
    real.solve(b);
    assertThat(b).isEqualTo(x);
  }

  private static double[] part(double[] interleaved, int part) {
    return IntStream.range(0, interleaved.length / 2)
        .mapToDouble(i -> interleaved[2 * i + part])
        .toArray();
  }

  private static double residual(
      RandomMatrices.Sparse matrix, double[] values, double[] x, double[] b) {
    double worst = 0;
    double largestX = 0;
    double largestB = 0;
    double norm = 0;
    double[][] dense = matrix.dense(values);
    for (int row = 0; row < b.length; row++) {
      double sum = -b[row];
      double absolute = 0;
      for (int column = 0; column < b.length; column++) {
        sum += dense[row][column] * x[column];
        absolute += Math.abs(dense[row][column]);
      }
      worst = Math.max(worst, Math.abs(sum));
      norm = Math.max(norm, absolute);
      largestX = Math.max(largestX, Math.abs(x[row]));
      largestB = Math.max(largestB, Math.abs(b[row]));
    }
    return worst / (norm * largestX + largestB);
  }
}
