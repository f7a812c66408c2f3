package loopwright.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * The value of a record component that is not written: a value as a person would write it ({@code
 * "0"}, {@code "infinite"}, {@code "false"}), or {@code "{}"} for a block whose own fields all have
 * defaults. A component without this annotation that is neither optional nor a collection is
 * needed.
 */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Otherwise {
  /** The default in the file's own spelling. */
  String value();
}
