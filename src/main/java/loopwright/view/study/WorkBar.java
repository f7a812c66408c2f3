package loopwright.view.study;

import java.util.function.Consumer;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import loopwright.task.Receiver;
import loopwright.task.TaskRunner;
import loopwright.task.Work;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** Starts work, shows how far it is, lets it be stopped, and says what went wrong. */
final class WorkBar extends JPanel {
  private static final int FULL = 1000;

  private final TaskRunner runner;
  private final JButton start;
  private final JButton stop = Theme.style(new JButton("Stop"), "pill");
  private final JProgressBar progress = new JProgressBar(0, FULL);
  private final JLabel says = Theme.style(new JLabel(" "), "quiet");

  /**
   * @param label of the button that starts it
   * @param mnemonic of that button
   * @param onStart called when a person starts it
   */
  WorkBar(TaskRunner runner, String label, char mnemonic, Runnable onStart) {
    super(new MigLayout("insets 0, fillx", "[][][160!][grow,fill]"));
    Theme.style(this, "plain");
    this.runner = runner;
    start = Theme.style(new JButton(label), "pill");
    start.setName("start");
    start.setMnemonic(mnemonic);
    start.addActionListener(event -> onStart.run());
    stop.setName("stop");
    stop.setMnemonic('S');
    stop.setEnabled(false);
    stop.addActionListener(event -> stop());
    progress.setName("progress");
    progress.getAccessibleContext().setAccessibleName("Progress");
    progress.setVisible(false);
    says.setName("says");
    add(start);
    add(stop);
    add(progress, "hidemode 2");
    add(says, "wmin 0");
  }

  /** The button that starts the work, to be the default one. */
  JButton startButton() {
    return start;
  }

  /**
   * Runs work in place of whatever ran before.
   *
   * @param take takes its result
   */
  <T> void run(Work<T> work, Consumer<T> take) {
    running(true);
    tell("");
    runner.run(
        work,
        new Receiver<T>() {
          @Override
          public void progressed(double share, String doing) {
            progress.setValue((int) (FULL * share));
            says.setText(doing + "…");
          }

          @Override
          public void finished(T result) {
            running(false);
            tell("");
            take.accept(result);
          }

          @Override
          public void failed(RuntimeException cause) {
            running(false);
            complain(cause.getMessage() == null ? cause.toString() : cause.getMessage());
          }
        });
  }

  /** Says what cannot be. */
  void complain(String wrong) {
    says.setText(wrong);
    says.setToolTipText(wrong);
    Theme.style(says, "failing");
  }

  /** Says what was done. */
  void say(String done) {
    tell(done);
  }

  private void tell(String what) {
    says.setText(what.isEmpty() ? " " : what);
    says.setToolTipText(null);
    Theme.style(says, "quiet");
  }

  private void stop() {
    runner.cancel();
    running(false);
    tell("Stopped.");
  }

  private void running(boolean isRunning) {
    stop.setEnabled(isRunning);
    progress.setValue(0);
    progress.setVisible(isRunning);
  }
}
