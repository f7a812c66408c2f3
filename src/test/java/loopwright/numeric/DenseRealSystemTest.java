package loopwright.numeric;

/** The dense real system keeps what every real system promises. */
class DenseRealSystemTest extends RealSystemChecks {
  @Override
  RealSystem system(SparsityPattern pattern) {
    return new DenseRealSystem(pattern);
  }
}
