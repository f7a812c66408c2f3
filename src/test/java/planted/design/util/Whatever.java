package planted.design.util;

/** Lives in a package without a subject, which does not say what it is for. */
record Whatever() {}
