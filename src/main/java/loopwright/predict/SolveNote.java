package loopwright.predict;

/**
 * What is to be said about how a hookup was solved.
 *
 * @param where node, part, device or hookup that it concerns
 * @param says in a sentence
 */
public record SolveNote(String where, String says) {}
