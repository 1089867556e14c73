/** Source texts, places in them, and findings: what the user is told about what they wrote. */
@NullMarked
package loadmark.diagnostic;

import org.jspecify.annotations.NullMarked;
