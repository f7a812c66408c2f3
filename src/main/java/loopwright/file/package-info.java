/**
 * JSON design files and shelf files: the text, the tree that keeps an author's spelling, and the
 * mechanism that binds it to the records of a design. The only package that imports Jackson. May
 * import {@code quantity}, {@code part} and {@code design}.
 */
package loopwright.file;
