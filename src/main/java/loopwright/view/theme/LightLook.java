package loopwright.view.theme;

import com.formdev.flatlaf.FlatLightLaf;

/** The look by daylight; its values stand in the properties file of the same name. */
public final class LightLook extends FlatLightLaf {
  @Override
  public String getName() {
    return "Loopwright light";
  }
}
