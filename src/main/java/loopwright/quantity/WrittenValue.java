package loopwright.quantity;

import java.util.Optional;

/**
 * A value that was read without knowing what it ought to be.
 *
 * @param quantity the value, in the plain unit, with its spelling
 * @param unit the unit that stood behind it; empty when none did
 */
public record WrittenValue(Quantity quantity, Optional<Unit> unit) {}
