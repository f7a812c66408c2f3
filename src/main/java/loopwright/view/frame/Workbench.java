package loopwright.view.frame;

import java.awt.BorderLayout;
import java.awt.KeyboardFocusManager;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import loopwright.part.Shelf;
import loopwright.predict.HookupPrediction;
import loopwright.session.Session;
import loopwright.session.Snapshot;
import loopwright.view.chart.PlotDeck;
import loopwright.view.form.CommitField;
import loopwright.view.form.FormPanel;
import loopwright.view.path.SignalPathPanel;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** Everything inside the window: one screen that answers. */
final class Workbench extends JPanel {
  private static final int GAP = 8;
  private static final String FIRST_BLOCK = "amplifier.gainStage";

  private final JLabel name = Theme.style(new JLabel(), "title");
  private final JLabel edited = Theme.style(new JLabel(), "quiet");
  private final HookupChooser hookups;
  private final StatusLine status = new StatusLine();
  private final SignalPathPanel path = new SignalPathPanel();
  private final FormPanel form;
  private final PlotDeck plots = new PlotDeck();
  private final FiguresPanel figures;
  private final FindingsPanel findings;

  /**
   * @param session the open design
   * @param shelf parts to choose from beside those of the design
   */
  Workbench(Session session, Shelf shelf) {
    super(new BorderLayout(0, GAP));
    setBorder(BorderFactory.createEmptyBorder(0, 0, GAP, 0));
    hookups = new HookupChooser(session::choose);
    form = new FormPanel(shelf, session::edit);
    figures = new FiguresPanel(session::measure);
    findings = new FindingsPanel(form::blockAt, this::select, session::edit);
    path.onSelect(form::select);
    form.onSelect(path::select);
    add(head(), BorderLayout.NORTH);
    add(new Panes(card(path), form, card(plots), figures, findings), BorderLayout.CENTER);
    show(session.snapshot());
    session.onChange(this::show);
    select(FIRST_BLOCK);
  }

  private JPanel head() {
    JPanel head =
        Theme.style(
            new JPanel(new MigLayout("insets 0, fillx", "[][]16[]push[grow,right]")), "bar");
    name.setName("name");
    edited.setName("edited");
    head.add(name, "wmin 0");
    head.add(edited);
    head.add(hookups, "wmin 0");
    head.add(status, "wmin 0");
    return head;
  }

  private static JPanel card(JComponent content) {
    JPanel card = Theme.style(new JPanel(new BorderLayout()), "card");
    card.add(content);
    return card;
  }

  private void show(Snapshot snapshot) {
    name.setText(snapshot.design().name());
    name.setToolTipText(snapshot.design().notes().orElse(null));
    edited.setText(snapshot.unsaved() ? "edited" : "");
    hookups.show(snapshot);
    status.show(snapshot);
    path.show(
        snapshot.design(),
        snapshot.chosen(),
        snapshot.current() ? snapshot.prediction() : Optional.empty());
    path.mark(snapshot.current() ? snapshot.findings() : List.of());
    form.show(snapshot);
    Optional<HookupPrediction> prediction =
        snapshot.unsolved().isPresent() ? Optional.empty() : snapshot.prediction();
    plots.show(prediction, snapshot.current(), snapshot.current() ? "" : StatusLine.says(snapshot));
    figures.show(snapshot);
    findings.show(snapshot);
  }

  private void select(String block) {
    path.select(block);
    form.select(block);
  }

  /** Makes a value that is being typed count, if it can be. */
  void commitTyping() {
    figures.commit();
    if (KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner()
        instanceof CommitField field) {
      field.commit();
    }
  }
}
