package planted.circuit;

/** Writes to a stream that belongs to the caller. */
record Talks() {
  void say() {
    System.out.println("a word out of place");
  }
}
