package planted.sheet;

import java.awt.Graphics2D;

/** Breaks nothing: the sheet may paint. */
record Blameless(Graphics2D paper) {}
