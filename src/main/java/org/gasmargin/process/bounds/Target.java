package org.gasmargin.process.bounds;

/**
 * Where a branch ends, as values of its coordinate: anywhere from the nearer to the further, as the
 * tolerances of the step allow.
 *
 * @param near the nearer end
 * @param far the further end
 */
record Target(double near, double far) {}
