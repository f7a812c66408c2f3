package planted.circuit;

import java.awt.Color;

/** A circuit that has a colour. */
record Paints(Color colour) {}
