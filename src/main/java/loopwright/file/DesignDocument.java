package loopwright.file;

import loopwright.design.Design;

/**
 * A design as it was read, with the text that it came from.
 *
 * @param design the design, with every part record that it uses
 * @param written the design as its file says it, without records that came from the shelf
 * @param source the file's own tree, from which an unchanged value keeps its author's spelling
 */
public record DesignDocument(Design design, Design written, Json source) {}
