/**
 * Notes as files: reading and writing notebooks (nbformat 4) and sheets without changing what is
 * not ours.
 */
@NullMarked
package whorl.notebook;

import org.jspecify.annotations.NullMarked;
