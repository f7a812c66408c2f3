package loopwright.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** The word, or words, by which a file tells this variant of a sealed family from its siblings. */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.TYPE)
public @interface Kind {
  /** The value or values of the field {@code kind}. */
  String[] value();
}
