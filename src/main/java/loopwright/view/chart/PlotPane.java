package loopwright.view.chart;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Font;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JPanel;
import loopwright.predict.HookupPrediction;

/** One tab of the deck: what is to be said first, the title, its sentence, the plot. */
final class PlotPane extends JPanel {
  private final String tab;
  private final WrappedText note = new WrappedText();
  private final WrappedText title = new WrappedText();
  private final WrappedText sentence = new WrappedText();
  private final ChartCanvas canvas = new ChartCanvas();

  PlotPane(String tab) {
    super(new BorderLayout(0, 6));
    this.tab = tab;
    JPanel words = new JPanel();
    words.setOpaque(false);
    words.setLayout(new BoxLayout(words, BoxLayout.Y_AXIS));
    for (Component part : new Component[] {note, title, Box.createVerticalStrut(2), sentence}) {
      words.add(part);
    }
    add(words, BorderLayout.NORTH);
    add(canvas, BorderLayout.CENTER);
    note.setName("note");
    title.setName("title");
    sentence.setName("sentence");
    canvas.setName("canvas");
    setBorder(BorderFactory.createEmptyBorder(10, 12, 6, 8));
  }

  String tab() {
    return tab;
  }

  /** Shows the prediction, or why it has no picture. */
  void show(PlotSubject subject, HookupPrediction prediction, boolean current, String message) {
    PlotTheme theme = PlotTheme.current();
    Picture picture =
        prediction.rest().isEmpty()
            ? Picture.none("Not solved", Words.sentences(prediction.failure()))
            : subject.picture(prediction, theme);
    String outOfDate = "Out of date. " + Words.sentences(message);
    dress(theme, picture, current ? Words.sentences(message) : outOfDate.strip(), !current);
    if (prediction.rest().isEmpty()) {
      title.setForeground(theme.fails());
    }
  }

  /** Shows a picture that belongs to what was worked out and to nothing else. */
  void show(ResultPlot plot) {
    PlotTheme theme = PlotTheme.current();
    dress(theme, plot.picture(theme), "", false);
  }

  /** Shows that there is no prediction, and why. */
  void showNone(String message) {
    String says = message.isBlank() ? "Nothing is solved yet" : message;
    dress(PlotTheme.current(), Picture.none("No prediction", Words.sentences(says)), "", false);
  }

  private void dress(PlotTheme theme, Picture picture, String says, boolean outOfDate) {
    setBackground(theme.background());
    canvas.setBackground(theme.background());
    note.says(says);
    note.setVisible(!says.isEmpty());
    note.setFont(theme.font().deriveFont(Font.BOLD));
    note.setForeground(outOfDate ? theme.risky() : theme.quiet());
    title.says(picture.title());
    title.setFont(theme.title());
    title.setForeground(theme.text());
    sentence.says(picture.sentence());
    sentence.setFont(theme.font());
    sentence.setForeground(theme.quiet());
    canvas.show(picture.chart(), outOfDate);
    canvas.titled(picture.title());
    canvas.getAccessibleContext().setAccessibleName(tab + ": " + picture.title());
    canvas.getAccessibleContext().setAccessibleDescription(picture.sentence());
    revalidate();
    repaint();
  }
}
