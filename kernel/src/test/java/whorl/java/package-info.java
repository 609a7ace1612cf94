@NullMarked
package whorl.java;

import org.jspecify.annotations.NullMarked;
