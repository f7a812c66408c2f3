package loopwright.bench;

/**
 * What to read next: the voltage whose prediction differs most between the explanations that lead.
 *
 * @param hookup name of the hookup
 * @param quantity what to read
 * @param node where
 * @param says what each leading explanation would show there
 */
public record NextReading(String hookup, String quantity, String node, String says) {}
