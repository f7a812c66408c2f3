package planted.view;

import java.awt.Color;
import javax.swing.JPanel;

/** Breaks nothing: the view may use windows and colours. */
record Blameless(JPanel panel, Color colour) {}
