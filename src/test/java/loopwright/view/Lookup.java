package loopwright.view;

import java.awt.Component;
import java.awt.Container;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JMenu;

/** Finds components by the names that the views give them. */
public final class Lookup {
  private Lookup() {}

  /** The component of that name. */
  public static <C> C named(Container root, String name, Class<C> type) {
    return find(root, name)
        .map(type::cast)
        .orElseThrow(() -> new AssertionError("no component is called " + name));
  }

  /** The component of that name, if there is one. */
  public static Optional<Component> find(Container root, String name) {
    List<Component> found = new ArrayList<>();
    walk(
        root,
        component -> {
          if (name.equals(component.getName())) {
            found.add(component);
          }
        });
    return found.stream().findFirst();
  }

  /** All components of a type, from the outside inward. */
  public static <C> List<C> all(Container root, Class<C> type) {
    List<C> found = new ArrayList<>();
    walk(
        root,
        component -> {
          if (type.isInstance(component)) {
            found.add(type.cast(component));
          }
        });
    return found;
  }

  private static void walk(Component component, Consumer<Component> visitor) {
    visitor.accept(component);
    if (component instanceof JMenu menu) {
      walk(menu.getPopupMenu(), visitor);
    }
    if (component instanceof Container container) {
      for (Component child : container.getComponents()) {
        walk(child, visitor);
      }
    }
  }
}
