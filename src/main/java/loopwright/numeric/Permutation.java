package loopwright.numeric;

/** Facts about permutations. */
final class Permutation {
  private Permutation() {}

  /** 1 when the permutation is even, −1 when it is odd; {@code order} holds 0 … size − 1. */
  static int sign(int[] order, int size) {
    boolean[] seen = new boolean[size];
    int sign = 1;
    for (int start = 0; start < size; start++) {
      int length = 0;
      for (int at = start; !seen[at]; at = order[at]) {
        seen[at] = true;
        length++;
      }
      if (length > 0 && length % 2 == 0) {
        sign = -sign;
      }
    }
    return sign;
  }
}
