package loopwright.view.form;

import java.util.Optional;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.session.Edit;
import loopwright.view.form.Containers.Container;

/** Edits of the hookups as a whole. */
public final class HookupEdits {
  private HookupEdits() {}

  /** A copy of a hookup under another name, at the end of the list. */
  public static Edit copy(Design design, String hookup) {
    return WholeEdits.add(design, hookups(design), Optional.of(hookup));
  }

  /**
   * Without a hookup.
   *
   * @throws loopwright.design.DesignException when it is the only one
   */
  public static Edit remove(Design design, String hookup) {
    return WholeEdits.remove(design, hookups(design), hookup);
  }

  private static Container hookups(Design design) {
    return new Container("hookups", DesignPath.field(design, "hookups"));
  }
}
