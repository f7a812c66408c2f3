package planted.circuit;

/** Ends a program that is not its own. */
record Exits() {
  void leave() {
    System.exit(3);
  }
}
