/** Text to tree: lexer, parser, expressions and statements, and the canonical printer. */
@NullMarked
package whorl.syntax;

import org.jspecify.annotations.NullMarked;
