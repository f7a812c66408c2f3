package planted.sheet;

import javax.swing.JPanel;

/** May paint, but not on a window. */
record PaintsWithSwing(JPanel panel) {}
