package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.stream.Collectors;
import javax.swing.JComboBox;
import javax.swing.JTable;
import javax.swing.JTextArea;
import loopwright.design.Design;
import loopwright.file.DesignFile;
import loopwright.file.ShelfFile;
import loopwright.predict.Catalogue;
import loopwright.predict.Figure;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** Printed figures stand beside what the model returns, and every figure used comes back. */
@ExtendWith(OnEventThread.class)
class PartsPanelTest {
  @Test
  void printedAndReturnedFiguresStandSideBySide() {
    Theme.LIGHT.apply();
    Design design =
        new DesignFile(
                new ShelfFile().shipped(),
                Catalogue.figures().stream().collect(Collectors.toMap(Figure::key, Figure::unit)))
            .read(Path.of("examples/seismometer-coil.json"))
            .design();
    PartsPanel panel = new PartsPanel(design);
    JComboBox<?> parts = Lookup.named(panel, "parts", JComboBox.class);
    assertThat(parts.getItemCount()).isEqualTo(design.parts().size());
    JTable table = Lookup.named(panel, "comparison", JTable.class);
    parts.setSelectedItem("BC547B");
    assertThat(table.getRowCount()).isGreaterThan(4);
    boolean voltage = false;
    for (int row = 0; row < table.getRowCount(); row++) {
      String printed = String.valueOf(table.getValueAt(row, 2));
      if (printed.equals("660 mV")) {
        voltage = true;
        assertThat(table.getValueAt(row, 3)).isEqualTo(printed);
      }
    }
    assertThat(voltage).as("the typical V_BE of 0.66 V at 2 mA").isTrue();
    assertThat(Lookup.named(panel, "notes", JTextArea.class).getText()).contains("Source");
  }
}
