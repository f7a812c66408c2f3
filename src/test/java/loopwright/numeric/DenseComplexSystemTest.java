package loopwright.numeric;

/** The dense complex system keeps what every complex system promises. */
class DenseComplexSystemTest extends ComplexSystemChecks {
  @Override
  ComplexSystem system(SparsityPattern pattern) {
    return new DenseComplexSystem(pattern);
  }
}
