package loopwright.view.study;

import java.awt.image.BufferedImage;
import java.awt.print.PrinterException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javax.swing.JButton;
import javax.swing.JComboBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTabbedPane;
import loopwright.design.Design;
import loopwright.file.DesignChecksum;
import loopwright.session.Snapshot;
import loopwright.sheet.BenchSheet;
import loopwright.sheet.Paper;
import loopwright.sheet.SheetFile;
import loopwright.sheet.SheetMaker;
import loopwright.sheet.SheetPages;
import loopwright.view.theme.Theme;
import net.miginfocom.swing.MigLayout;

/** The sheet for the bench: looked at, saved as PDF or HTML, printed. */
public final class SheetStudy extends Study {
  /** Fine enough for a dense screen. */
  private static final double DOTS_PER_INCH = 160;

  private final transient Desk desk;
  private final transient Function<String, Optional<Path>> place;
  private final JComboBox<String> paper =
      new JComboBox<>(new String[] {Paper.A4.says(), Paper.LETTER.says()});
  private final JLabel where = Theme.style(new JLabel(), "quiet");
  private final JButton save = Theme.style(new JButton("Save sheet…"), "pill");
  private final JButton print = Theme.style(new JButton("Print…"), "pill");
  private final PagesView pages = new PagesView();
  private final SheetReadings readings;
  private final WorkBar bar;
  private transient Optional<Made> made = Optional.empty();

  /** A sheet and its pages. */
  private record Made(BenchSheet sheet, SheetPages pages, List<BufferedImage> seen) {}

  /**
   * @param desk the window's session
   */
  public SheetStudy(Desk desk) {
    this(desk, null);
  }

  /**
   * @param desk the window's session
   * @param place asks where to save, by the design's name; null for the usual dialog
   */
  SheetStudy(Desk desk, Function<String, Optional<Path>> place) {
    super("Bench sheet");
    this.desk = desk;
    this.place = place == null ? new SheetPlace(this)::ask : place;
    bar = new WorkBar(desk.runners().get(), "Make sheet", 'M', this::make);
    paper.setName("paper");
    paper.addActionListener(event -> forget());
    where.setName("where");
    save.setName("save");
    save.setMnemonic('V');
    save.addActionListener(event -> save());
    print.setName("print");
    print.setMnemonic('P');
    print.addActionListener(event -> print());
    add(new Inputs().field("Paper", 'R', paper, 90).own(where));
    add(buttons());
    readings = new SheetReadings(desk);
    JTabbedPane tabs = new JTabbedPane();
    tabs.setName("tabs");
    JScrollPane scroll = new JScrollPane(pages);
    scroll.setName("scroll");
    tabs.addTab("Pages", scroll);
    tabs.addTab("Type readings", readings);
    tabs.setMnemonicAt(0, 'G');
    tabs.setMnemonicAt(1, 'T');
    add(tabs, "hmin 200");
    show(desk.now().get());
    forget();
    bar.say("Nothing made yet.");
  }

  private JPanel buttons() {
    JPanel buttons =
        Theme.style(new JPanel(new MigLayout("insets 0, fillx", "[grow,fill][][]")), "plain");
    buttons.add(bar, "wmin 0");
    buttons.add(save);
    buttons.add(print);
    return buttons;
  }

  @Override
  public void show(Snapshot snapshot) {
    where.setText("hookup " + snapshot.hookup() + " is drawn and powered first");
    if (made.filter(sheet -> !isStillSo(sheet, snapshot)).isPresent()) {
      forget();
      bar.say("The design or its hookup changed: make the sheet again.");
    } else {
      readings.show(made.map(Made::sheet));
    }
  }

  /** Readings may come in; anything else would stand on another sheet. */
  private static boolean isStillSo(Made sheet, Snapshot snapshot) {
    return sheet.sheet().hookup().equals(snapshot.hookup())
        && sheet.sheet().checksum().equals(DesignChecksum.of(snapshot.design()));
  }

  @Override
  public JButton defaultButton() {
    return bar.startButton();
  }

  /** What was made is no more what it would be. */
  private void forget() {
    made = Optional.empty();
    pages.show(List.of());
    readings.show(Optional.empty());
    save.setEnabled(false);
    print.setEnabled(false);
  }

  private void make() {
    Snapshot now = desk.now().get();
    Design design = now.design();
    String hookup = now.hookup();
    Paper size = paper();
    bar.run(
        progress -> {
          BenchSheet sheet = new SheetMaker(LocalDate.now()).make(design, hookup, progress);
          progress.check();
          progress.report(0.9, "laying out");
          SheetPages laid = new SheetPages(sheet, size);
          return new Made(sheet, laid, laid.pictures(DOTS_PER_INCH));
        },
        this::showMade);
  }

  private Paper paper() {
    return Paper.find((String) paper.getSelectedItem()).orElseThrow();
  }

  private void showMade(Made sheet) {
    if (!isStillSo(sheet, desk.now().get())) {
      bar.complain("The design changed meanwhile: make the sheet again.");
      return;
    }
    made = Optional.of(sheet);
    pages.show(sheet.seen());
    readings.show(Optional.of(sheet.sheet()));
    save.setEnabled(true);
    print.setEnabled(true);
  }

  private void save() {
    BenchSheet sheet = made.orElseThrow().sheet();
    place
        .apply(sheet.title())
        .ifPresent(
            file -> {
              Paper size = paper();
              SheetFile kind = SheetFile.of(file).orElse(SheetFile.PDF);
              bar.run(
                  progress -> {
                    kind.write(sheet, size, file);
                    return file;
                  },
                  written -> bar.say("Saved " + written.getFileName() + "."));
            });
  }

  private void print() {
    try {
      made.orElseThrow().pages().print();
    } catch (PrinterException e) {
      bar.complain("Cannot print: " + e.getMessage());
    }
  }
}
