/** YAML text as a tree of nodes with places; hostile text is refused before a tree exists. */
@NullMarked
package org.gasmargin.yaml;

import org.jspecify.annotations.NullMarked;
