/** Mass flow through orifices and valves. */
@NullMarked
package org.gasmargin.flow;

import org.jspecify.annotations.NullMarked;
