/**
 * The wire between a page and a Jupyter front end: sockets, messages, and what is answered to each
 * kind of request. Nothing else in Whorl knows of Jupyter.
 */
@NullMarked
package whorl.jupyter;

import org.jspecify.annotations.NullMarked;
