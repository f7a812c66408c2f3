package loopwright.view.frame;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JPanel;
import loopwright.check.Finding;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.DesignPath;
import loopwright.design.PartValue;
import loopwright.session.Assessment;
import loopwright.session.Edit;
import loopwright.session.Predictions;
import loopwright.session.SampleDesigns;
import loopwright.session.Session;
import loopwright.view.Lookup;
import loopwright.view.OnEventThread;
import loopwright.view.Painting;
import loopwright.view.theme.Theme;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

/** Findings as sentences, each with its place and its cure. */
@ExtendWith(OnEventThread.class)
class FindingsPanelTest {
  private static final String CAPACITOR = "amplifier.gainStage.compensation.capacitance";

  private static final Finding OSCILLATES =
      new Finding(
          Finding.Severity.FAILS,
          "amplifier.gainStage",
          "Oscillates at rest: it grows at 13 MHz.",
          "A compensation capacitor of 47 pF keeps every level stable.",
          List.of(new Change(CAPACITOR, "47p")));

  private static final Finding HOT =
      new Finding(Finding.Severity.RISKY, "out.upper", "It gets hot.", "A heat sink of 40 K/W.");

  private final List<String> shown = new ArrayList<>();
  private FindingsPanel panel;
  private Session session;

  /** The cured design has only the other finding left. */
  @BeforeEach
  void open() {
    Theme.LIGHT.apply();
    session =
        SampleSessions.with(
            (design, hookups, progress) ->
                new Assessment(
                    Predictions.assess(design, hookups).prediction(),
                    capacitance(design).equals(Optional.of(47e-12))
                        ? List.of(HOT)
                        : List.of(OSCILLATES, HOT)));
    panel = new FindingsPanel(Optional::of, shown::add, session::edit);
    panel.show(session.snapshot());
    session.onChange(panel::show);
  }

  private static Optional<Double> capacitance(Design design) {
    return DesignPath.find(design, CAPACITOR).map(part -> ((PartValue) part).effective());
  }

  private List<JButton> buttons() {
    return Lookup.all(Lookup.named(panel, "findings", JPanel.class), JButton.class);
  }

  private JButton button(String name) {
    return Lookup.named(panel, name, JButton.class);
  }

  @Test
  void aRemedyThatIsAValueIsAButtonThatSaysWhatItSets() {
    assertThat(button("remedy.amplifier.gainStage").getText())
        .isEqualTo("Set compensation capacitor to 47 pF");
    assertThat(Lookup.find(panel, "remedy.out.upper")).isEmpty();
  }

  @Test
  void aClickIsOneEditThatIsUndoneByItsName() {
    Optional<Double> before = capacitance(session.snapshot().design());
    button("remedy.amplifier.gainStage").doClick(0);
    assertThat(capacitance(session.snapshot().design())).contains(47e-12);
    assertThat(session.snapshot().undoable()).contains("Set compensation capacitor to 47 pF");
    assertThat(Lookup.find(panel, "remedy.amplifier.gainStage")).isEmpty();
    session.undo();
    assertThat(capacitance(session.snapshot().design())).isEqualTo(before);
    assertThat(session.snapshot().undoable()).isEmpty();
  }

  @Test
  void aRemedyKeepsWhatWasEditedSinceItWasFound() {
    session.edit(
        Edit.of("Load 10k", SampleDesigns.withGainLoad(session.snapshot().design(), "10k")));
    button("remedy.amplifier.gainStage").doClick(0);
    assertThat(capacitance(session.snapshot().design())).contains(47e-12);
    assertThat(DesignPath.get(session.snapshot().design(), "amplifier.gainStage.load.resistance"))
        .isInstanceOfSatisfying(
            PartValue.class, part -> assertThat(part.effective()).isEqualTo(10e3));
  }

  @Test
  void thePlaceOfAFindingIsShown() {
    button("show.out.upper").doClick(0);
    assertThat(shown).containsExactly("out.upper");
  }

  @Test
  void everyButtonIsReachedByTheKeyboardAndReadOut() {
    assertThat(buttons()).hasSize(3).allMatch(JButton::isFocusable);
    assertThat(buttons())
        .extracting(button -> button.getAccessibleContext().getAccessibleName())
        .containsExactly(
            "Show amplifier.gainStage", "Set compensation capacitor to 47 pF", "Show out.upper");
    assertThat(
            button("remedy.amplifier.gainStage").getAccessibleContext().getAccessibleDescription())
        .contains("13 MHz");
  }

  @Test
  void severalValuesAreSetByOneButton() {
    Finding heavy =
        new Finding(
            Finding.Severity.RISKY,
            "hookups.divider.feedback",
            "The divider is heavy.",
            "Ten times as much takes a tenth.",
            List.of(
                new Change("hookups.divider.feedback.upper", "100k"),
                new Change("hookups.divider.feedback.lower", "10k")));
    assertThat(new RemedyWords().button(session.snapshot().design(), heavy))
        .isEqualTo("Set upper resistor to 100 kΩ, lower resistor to 10 kΩ");
    assertThat(RemedyWords.changes(heavy.changes()))
        .isEqualTo("hookups.divider.feedback.upper = 100k, hookups.divider.feedback.lower = 10k");
  }

  /** As narrow as a window of 1024 pixels makes it. */
  @Test
  void noButtonLeavesANarrowPanel() {
    Painting.of(panel, 372, 220);
    JPanel list = Lookup.named(panel, "findings", JPanel.class);
    for (JButton button : buttons()) {
      assertThat(button.getX() + button.getWidth())
          .as(button.getText())
          .isLessThanOrEqualTo(list.getWidth());
      assertThat(button.getWidth())
          .as(button.getText())
          .isGreaterThanOrEqualTo(button.getPreferredSize().width);
    }
  }
}
