package loopwright.design;

/** Hookups and extras: their names and the nodes that they mention. */
final class HookupCheck {
  private final Problems problems;

  private HookupCheck(Problems problems) {
    this.problems = problems;
  }

  static void check(Design design, Problems problems) {
    HookupCheck check = new HookupCheck(problems);
    problems.checkNames("extras", design.extras().stream().map(Extra::name).toList());
    problems.checkNames("hookups", design.hookups().stream().map(Hookup::name).toList());
    if (design.hookups().isEmpty()) {
      problems.add("hookups", "none", "at least one hookup");
    }
    for (Extra extra : design.extras()) {
      String path = "extras." + extra.name();
      check.node(path + ".from", extra.from());
      check.node(path + ".to", extra.to());
      if (extra.from().equals(extra.to())) {
        problems.add(path + ".to", "\"" + extra.to() + "\" at both ends", "another node");
      }
    }
    for (Hookup hookup : design.hookups()) {
      for (int i = 0; i < hookup.probes().size(); i++) {
        check.node(
            "hookups." + hookup.name() + ".probes." + i + ".node", hookup.probes().get(i).node());
      }
    }
  }

  private void node(String path, String name) {
    if (!NodeNames.ALL.contains(name)) {
      problems.add(
          path, "\"" + name + "\", which is no node", "one of " + String.join(", ", NodeNames.ALL));
    }
  }
}
