package loopwright.view.path;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.Rectangle;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import javax.accessibility.AccessibleState;
import javax.swing.Action;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import loopwright.check.Finding;
import loopwright.design.Amplifier;
import loopwright.design.Hookup;
import loopwright.view.OnEventThread;
import loopwright.view.SampleDesigns;
import loopwright.view.SamplePredictions;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** Selecting by mouse, by keys and from outside. */
@ExtendWith(OnEventThread.class)
class SignalPathPanelTest {
  private final List<String> told = new ArrayList<>();
  private SignalPathPanel panel;

  @BeforeEach
  void light() {
    Theme.LIGHT.apply();
    panel = new SignalPathPanel();
    panel.onSelect(told::add);
    show(SampleDesigns.npn(), SampleDesigns.divider(0.2));
  }

  private void show(Amplifier amplifier, Hookup hookup) {
    panel.show(
        SampleDesigns.design(amplifier, hookup),
        hookup,
        Optional.of(SamplePredictions.stable(hookup)));
  }

  private List<BlockButton> buttons() {
    return Arrays.stream(panel.getComponents()).map(BlockButton.class::cast).toList();
  }

  private BlockButton button(String id) {
    return buttons().stream().filter(b -> id.equals(b.getName())).findFirst().orElseThrow();
  }

  private List<String> selected() {
    return buttons().stream().filter(BlockButton::isSelected).map(Component::getName).toList();
  }

  private void press(int key) {
    Object name =
        panel
            .getInputMap(JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT)
            .get(KeyStroke.getKeyStroke(key, 0));
    Action action = panel.getActionMap().get(name);
    action.actionPerformed(new ActionEvent(panel, ActionEvent.ACTION_PERFORMED, ""));
  }

  @Test
  void theRightArrowWalksAllBlocksInTheOrderOfTheSignal() {
    for (int i = 0; i < 9; i++) {
      press(KeyEvent.VK_RIGHT);
    }
    assertThat(told)
        .containsExactly(
            "source",
            "amplifier.inputPair",
            "amplifier.inputPair.tail",
            "amplifier.gainStage",
            "amplifier.gainStage.load",
            "amplifier.outputStage",
            "load",
            "feedback");
    assertThat(selected()).containsExactly("feedback");
  }

  @Test
  void theOtherKeysLeadBackUpDownAndToTheEnds() {
    press(KeyEvent.VK_END);
    press(KeyEvent.VK_LEFT);
    press(KeyEvent.VK_HOME);
    press(KeyEvent.VK_RIGHT);
    press(KeyEvent.VK_DOWN);
    press(KeyEvent.VK_UP);
    assertThat(told)
        .containsExactly(
            "feedback",
            "load",
            "source",
            "amplifier.inputPair",
            "amplifier.inputPair.tail",
            "amplifier.inputPair");
  }

  @Test
  void aClickSelectsAndTellsOnce() {
    button("amplifier.gainStage").doClick(0);
    button("amplifier.gainStage").doClick(0);
    assertThat(told).containsExactly("amplifier.gainStage");
    assertThat(selected()).containsExactly("amplifier.gainStage");
  }

  @Test
  void selectingFromOutsideTellsNobody() {
    panel.select("load");
    assertThat(told).isEmpty();
    assertThat(selected()).containsExactly("load");
    panel.select("no such block");
    assertThat(selected()).isEmpty();
  }

  @Test
  void theSelectionOutlivesAnEdit() {
    button("amplifier.gainStage").doClick(0);
    BlockButton before = button("amplifier.gainStage");
    show(SampleDesigns.withoutFollower(), SampleDesigns.inverting(0.1));
    assertThat(button("amplifier.gainStage")).isSameAs(before);
    assertThat(selected()).containsExactly("amplifier.gainStage");
  }

  @Test
  void anotherKindOfAmplifierHasOtherBlocks() {
    button("amplifier.gainStage").doClick(0);
    show(SampleDesigns.figures(), SampleDesigns.divider(0.2));
    assertThat(buttons())
        .extracting(Component::getName)
        .containsExactly("source", "amplifier", "load", "feedback");
    assertThat(selected()).isEmpty();
  }

  @Test
  void theTabKeyStopsOnce() {
    assertThat(buttons()).filteredOn(Component::isFocusable).hasSize(1);
    panel.select("load");
    assertThat(buttons())
        .filteredOn(Component::isFocusable)
        .extracting(Component::getName)
        .containsExactly("load");
  }

  @Test
  void blocksAreReadOut() {
    panel.mark(
        List.of(new Finding(Finding.Severity.FAILS, "gain.q1", "The gain stage saturates.", "")));
    BlockButton gain = button("amplifier.gainStage");
    panel.select("amplifier.gainStage");
    assertThat(gain.getAccessibleContext().getAccessibleName()).isEqualTo("Gain stage");
    assertThat(gain.getAccessibleContext().getAccessibleDescription())
        .isEqualTo("pnp QP; 33 pF Miller; 100 Ω emitter; 1.52 mA. The gain stage saturates.");
    assertThat(
            gain.getAccessibleContext().getAccessibleStateSet().contains(AccessibleState.CHECKED))
        .isTrue();
    assertThat(panel.getAccessibleContext().getAccessibleName()).isEqualTo("Signal path");
  }

  @Test
  void blocksDoNotOverlapAndStayInside() {
    int[][] sizes = {{760, 170}, {1000, 222}, {1900, 320}};
    for (int[] size : sizes) {
      panel.setSize(size[0], size[1]);
      panel.doLayout();
      Rectangle inside = new Rectangle(0, 0, size[0], size[1]);
      List<BlockButton> all = buttons();
      for (int i = 0; i < all.size(); i++) {
        assertThat(inside.contains(all.get(i).getBounds()))
            .as(all.get(i).getName() + " at " + size[0])
            .isTrue();
        for (int j = 0; j < i; j++) {
          assertThat(all.get(i).getBounds().intersects(all.get(j).getBounds()))
              .as(all.get(i).getName() + " on " + all.get(j).getName())
              .isFalse();
        }
      }
    }
  }
}
