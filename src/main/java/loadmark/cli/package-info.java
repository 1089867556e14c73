/** Arguments, files, streams and exit status. */
@NullMarked
package loadmark.cli;

import org.jspecify.annotations.NullMarked;
