/** Network to compiled nodal equations, once a topology. */
@NullMarked
package loadmark.equation;

import org.jspecify.annotations.NullMarked;
