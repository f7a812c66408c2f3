package loopwright.propose;

/** Ends a run whose specification nothing at hand can meet. */
final class CannotException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Demand demand;

  /**
   * @param demand that fails, with what would have to give
   */
  CannotException(Demand demand) {
    super(demand.says());
    this.demand = demand;
  }

  Demand demand() {
    return demand;
  }
}
