package loopwright.view.frame;

import java.awt.Dimension;
import java.awt.EventQueue;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JFrame;
import javax.swing.Timer;
import javax.swing.WindowConstants;
import loopwright.part.Shelf;
import loopwright.session.Preferences;
import loopwright.session.Session;
import loopwright.session.Snapshot;
import loopwright.task.BackgroundRunner;
import loopwright.task.TaskRunner;
import loopwright.view.study.Desk;
import loopwright.view.study.Studies;
import loopwright.view.theme.Theme;

/** The main window. All of it belongs to the event thread. */
public final class MainWindow {
  private static final Dimension USUAL = new Dimension(1440, 900);
  private static final Dimension LEAST = new Dimension(1024, 700);

  /** Unsaved work is kept so long after the last change, ms. */
  private static final int AUTOSAVE = 1500;

  private final JFrame frame = new JFrame();
  private final Session session;
  private final Commands commands;
  private final MainMenu menu;
  private final Studies studies;
  private final Keeping keeping;
  private final Timer saving;
  private final List<TaskRunner> runners = new ArrayList<>();

  /**
   * A window on a session, with its usual dialogs.
   *
   * @param session the open design; closed when the window is
   * @param shelf parts to choose from beside those of the design
   * @param theme applied before anything is made
   * @param keeping what is kept from one run to the next
   */
  public MainWindow(Session session, Shelf shelf, Theme theme, Keeping keeping) {
    this(session, shelf, theme, keeping, null);
  }

  /**
   * A window on a session.
   *
   * @param dialogs asks in between; null for the usual ones
   */
  MainWindow(Session session, Shelf shelf, Theme theme, Keeping keeping, Dialogs dialogs) {
    theme.apply();
    this.session = session;
    this.keeping = keeping;
    this.saving = new Timer(AUTOSAVE, event -> keeping.work().keep());
    Workbench workbench = new Workbench(session, shelf);
    commands =
        new Commands(
            session, dialogs == null ? new SwingDialogs(frame) : dialogs, workbench::commitTyping);
    studies = new Studies(frame, new Desk(session::snapshot, session::edit, this::runner), shelf);
    menu =
        new MainMenu(
            commands,
            theme,
            this::choose,
            session::choose,
            studies,
            keeping.beginnings(),
            this::quit);
    saving.setRepeats(false);
    frame.setTransferHandler(new FileDrop(commands::openFile));
    frame.setName("window");
    frame.setJMenuBar(menu);
    frame.setContentPane(workbench);
    frame.setMinimumSize(LEAST);
    frame.setSize(USUAL.width, USUAL.height);
    frame.setDefaultCloseOperation(WindowConstants.DO_NOTHING_ON_CLOSE);
    frame.addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosing(WindowEvent event) {
            quit();
          }
        });
    show(session.snapshot());
    session.onChange(this::show);
  }

  /** Puts the window on the screen, as large as there is room. */
  public void open() {
    Rectangle room = GraphicsEnvironment.getLocalGraphicsEnvironment().getMaximumWindowBounds();
    Preferences.Size wanted =
        keeping.preferences().size().orElse(new Preferences.Size(USUAL.width, USUAL.height));
    frame.setSize(
        Math.min(Math.max(LEAST.width, wanted.width()), room.width),
        Math.min(Math.max(LEAST.height, wanted.height()), room.height));
    frame.setLocationRelativeTo(null);
    frame.setVisible(true);
    commands.offer(keeping.work());
  }

  /** The window itself. */
  JFrame frame() {
    return frame;
  }

  private void choose(Theme theme) {
    theme.apply();
    keeping.preferences().choose(theme.name());
  }

  private TaskRunner runner() {
    TaskRunner runner = new BackgroundRunner(EventQueue::invokeLater);
    runners.add(runner);
    return runner;
  }

  private void show(Snapshot snapshot) {
    frame.setTitle(title(snapshot));
    menu.show(snapshot);
    snapshot.path().ifPresent(keeping.preferences()::opened);
    menu.showRecent(keeping.preferences().recent());
    saving.restart();
    studies.tell(snapshot);
  }

  /** The design's name, an asterisk where it is not saved, and the file it is in. */
  static String title(Snapshot snapshot) {
    String file = snapshot.path().map(path -> " – " + path.getFileName()).orElse("");
    return (snapshot.unsaved() ? "*" : "") + snapshot.design().name() + file + " – Loopwright";
  }

  private void quit() {
    if (commands.mayLeave()) {
      saving.stop();
      keeping.work().forget();
      keeping.preferences().closed(new Preferences.Size(frame.getWidth(), frame.getHeight()));
      studies.close();
      runners.forEach(TaskRunner::close);
      session.close();
      frame.dispose();
    }
  }
}
