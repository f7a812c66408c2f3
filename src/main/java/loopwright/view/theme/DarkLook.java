package loopwright.view.theme;

import com.formdev.flatlaf.FlatDarkLaf;

/** The look by lamplight; its values stand in the properties file of the same name. */
public final class DarkLook extends FlatDarkLaf {
  @Override
  public String getName() {
    return "Loopwright dark";
  }
}
