package loopwright.numeric;

/** The sparse real system keeps what every real system promises. */
class SparseRealSystemTest extends RealSystemChecks {
  @Override
  RealSystem system(SparsityPattern pattern) {
    return new SystemFamily(pattern).real();
  }
}
