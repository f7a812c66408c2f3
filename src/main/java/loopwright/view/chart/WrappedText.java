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
}
