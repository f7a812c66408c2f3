package loopwright.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * What a value of a record component means: its unit and the range that makes sense. On a list or
 * an optional it speaks of what is inside. Readers, forms and the format's documentation all take
 * their knowledge from here.
 */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Measure {
  /** The unit in which a plain number is meant. */
  Unit unit();

  /** The values that make sense. */
  Range range() default Range.ANY;
}
