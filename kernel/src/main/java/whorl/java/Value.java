package whorl.java;

import org.jspecify.annotations.Nullable;

/**
 * The value of a text in Java.
 *
 * @param object what it is, which may be null
 */
record Value(@Nullable Object object) {}
