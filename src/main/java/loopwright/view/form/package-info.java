/**
 * Forms: a stage's values as fields that understand units, made from what the design says of its
 * own fields. May import {@code quantity}, {@code part}, {@code design}, {@code predict}, {@code
 * session} and {@code view.theme}.
 */
package loopwright.view.form;
