package loopwright.view.chart;

import javax.swing.JTextArea;

/** Words that wrap to the width they are given; not to be edited. */
final class WrappedText extends JTextArea {
  WrappedText() {
    setEditable(false);
    setFocusable(false);
    setLineWrap(true);
    setWrapStyleWord(true);
    setOpaque(false);
    setBorder(null);
    setHighlighter(null);
  }

  /** Shows the words; a line never ends between a number and its unit. */
  void says(String words) {
    setText(words.replaceAll("(\\d) (?=\\S)", "$1\u00A0"));
  }
}
