package loopwright.propose;

/**
 * Why a value is what it is.
 *
 * @param path of the design, or what was chosen where no single path holds it
 * @param value as a person reads it
 * @param says a sentence with the formula and its number
 */
public record Reason(String path, String value, String says) {}
