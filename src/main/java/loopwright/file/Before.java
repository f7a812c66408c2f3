package loopwright.file;

/**
 * How a value stood in the file that was read.
 *
 * @param value what it was read as
 * @param json how its author wrote it
 */
record Before<T>(T value, Json json) {}
