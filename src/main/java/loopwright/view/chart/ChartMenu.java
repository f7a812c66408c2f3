package loopwright.view.chart;

import java.awt.Toolkit;
import java.awt.datatransfer.StringSelection;
import java.awt.event.ActionEvent;
import java.nio.charset.StandardCharsets;
import java.util.function.BooleanSupplier;
import java.util.function.Function;
import javax.swing.AbstractAction;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import javax.swing.KeyStroke;
import javax.swing.event.PopupMenuEvent;
import javax.swing.event.PopupMenuListener;

/** The menu of a plot and its keys. */
final class ChartMenu {
  private static final int STEP = 2;
  private static final int LEAP = 25;

  private final ChartCanvas canvas;
  private final JPopupMenu menu = new JPopupMenu();

  ChartMenu(ChartCanvas canvas) {
    this.canvas = canvas;
  }

  /** Gives the canvas its menu and its keys. */
  void install() {
    BooleanSupplier hasChart = () -> canvas.chart().isPresent();
    item("Back", 'B', "ESCAPE", canvas::isZoomed, canvas::back);
    item("Whole plot", 'W', "HOME", canvas::isZoomed, canvas::whole);
    item("Closer", 'L', "PLUS", hasChart, canvas::closer);
    menu.addSeparator();
    item("Copy picture", 'P', "ctrl C", hasChart, this::copyPicture);
    item("Copy values", 'V', "ctrl shift C", hasChart, this::copyValues);
    menu.addSeparator();
    save("Save as PNG…", 'N', "png", ChartExport::png);
    save("Save as SVG…", 'G', "svg", ChartExport::svg);
    save("Save as CSV…", 'S', "csv", ChartMenu::csv);
    key("left", "LEFT", () -> canvas.step(-STEP));
    key("right", "RIGHT", () -> canvas.step(STEP));
    key("leapLeft", "shift LEFT", () -> canvas.step(-LEAP));
    key("leapRight", "shift RIGHT", () -> canvas.step(LEAP));
    key("nextCurve", "DOWN", () -> canvas.otherCurve(1));
    key("previousCurve", "UP", () -> canvas.otherCurve(-1));
    key("menu", "shift F10", this::open);
    key("menu", "CONTEXT_MENU", this::open);
    canvas.getInputMap().put(KeyStroke.getKeyStroke('+'), "Closer");
    canvas.getInputMap().put(KeyStroke.getKeyStroke("BACK_SPACE"), "Back");
    menu.setName("plot.menu");
    canvas.setComponentPopupMenu(menu);
  }

  private void open() {
    menu.show(canvas, canvas.getWidth() / 3, canvas.getHeight() / 3);
  }

  private void save(String words, char mnemonic, String suffix, Function<ChartExport, byte[]> as) {
    item(
        words,
        mnemonic,
        null,
        () -> canvas.chart().isPresent(),
        () ->
            canvas
                .export()
                .ifPresent(
                    export ->
                        new ChartPlace(canvas).save(suffix, canvas.title(), as.apply(export))));
  }

  private static byte[] csv(ChartExport export) {
    return export.table().text().getBytes(StandardCharsets.UTF_8);
  }

  private void copyPicture() {
    canvas
        .export()
        .ifPresent(
            export ->
                Toolkit.getDefaultToolkit()
                    .getSystemClipboard()
                    .setContents(new CopiedPicture(export.image()), null));
  }

  private void copyValues() {
    canvas
        .export()
        .ifPresent(
            export ->
                Toolkit.getDefaultToolkit()
                    .getSystemClipboard()
                    .setContents(new StringSelection(export.table().text()), null));
  }

  private void item(
      String words, char mnemonic, String key, BooleanSupplier isEnabled, Runnable does) {
    Does action = new Does(words, isEnabled, does);
    JMenuItem item = new JMenuItem(action);
    item.setName("plot." + words.replaceAll("[ …]", ""));
    item.setMnemonic(mnemonic);
    menu.add(item);
    canvas.getActionMap().put(words, action);
    if (key != null) {
      item.setAccelerator(KeyStroke.getKeyStroke(key));
      canvas.getInputMap().put(KeyStroke.getKeyStroke(key), words);
    }
    menu.addPopupMenuListener(
        new PopupMenuListener() {
          @Override
          public void popupMenuWillBecomeVisible(PopupMenuEvent event) {
            item.setEnabled(isEnabled.getAsBoolean());
          }

          @Override
          public void popupMenuWillBecomeInvisible(PopupMenuEvent event) {
            // Nothing to tidy.
          }

          @Override
          public void popupMenuCanceled(PopupMenuEvent event) {
            // Nothing to tidy.
          }
        });
  }

  private void key(String name, String key, Runnable does) {
    canvas.getActionMap().put(name, new Does(name, () -> canvas.chart().isPresent(), does));
    canvas.getInputMap().put(KeyStroke.getKeyStroke(key), name);
  }

  /** An action that a key finds disabled too, so that Esc closes a dialog where nothing is back. */
  private static final class Does extends AbstractAction {
    private final transient BooleanSupplier enabled;
    private final transient Runnable does;

    Does(String name, BooleanSupplier enabled, Runnable does) {
      super(name);
      this.enabled = enabled;
      this.does = does;
    }

    @Override
    public boolean isEnabled() {
      // The superclass's constructor asks before there is anything to ask.
      return enabled == null || enabled.getAsBoolean();
    }

    @Override
    public void actionPerformed(ActionEvent event) {
      does.run();
    }
  }
}
