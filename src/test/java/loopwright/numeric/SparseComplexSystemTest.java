package loopwright.numeric;

/** The sparse complex system keeps what every complex system promises. */
class SparseComplexSystemTest extends ComplexSystemChecks {
  @Override
  ComplexSystem system(SparsityPattern pattern) {
    return new SystemFamily(pattern).complex();
  }
}
