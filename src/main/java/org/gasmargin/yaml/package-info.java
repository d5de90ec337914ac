/** Text files of unknown origin: YAML as nodes with places, and what is wrong with them. */
@NullMarked
package org.gasmargin.yaml;

import org.jspecify.annotations.NullMarked;
