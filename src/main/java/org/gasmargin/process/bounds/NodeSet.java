package org.gasmargin.process.bounds;

import java.util.ArrayList;
import java.util.Collection;
import java.util.DoubleSummaryStatistics;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.apache.commons.math3.geometry.euclidean.twod.hull.MonotoneChain;
import org.gasmargin.gas.State;
import org.gasmargin.process.StepResult;

/**
 * The states in which a step can be entered.
 *
 * @param nodes extremes of the reachable states, at least one
 * @param complete whether every path that leads here was followed
 */
record NodeSet(List<Node> nodes, boolean complete) {
  private static final double SAME = 1e-10;

  NodeSet {
    nodes = List.copyOf(nodes);
  }

  /**
   * Only the extremes: the convex hull in (ln T, ln rho). Among its corners are the hottest, the
   * coldest, the fullest and the emptiest gas, and for gas near ideal those of highest and lowest
   * pressure and entropy. Of two equal states the one named first is kept.
   */
  NodeSet pruned() {
    Map<Vector2D, Node> byPoint = new LinkedHashMap<>();
    for (Node node : nodes) {
      State state = node.state();
      Vector2D point = new Vector2D(Math.log(state.temperature()), Math.log(state.molarDensity()));
      if (byPoint.keySet().stream().noneMatch(known -> known.distance(point) < SAME)) {
        byPoint.put(point, node);
      }
    }
    Collection<Vector2D> corners =
        byPoint.size() < 3
            ? byPoint.keySet()
            : new MonotoneChain(false, SAME).findHullVertices(byPoint.keySet());
    List<Node> kept = new ArrayList<>();
    byPoint.forEach(
        (point, node) -> {
          if (corners.contains(point)) {
            kept.add(node);
          }
        });
    return new NodeSet(kept, complete);
  }

  /** Least and most gas. */
  StepResult.DensityRange amount() {
    DoubleSummaryStatistics densities =
        nodes.stream().mapToDouble(node -> node.state().molarDensity()).summaryStatistics();
    return new StepResult.DensityRange(densities.getMin(), densities.getMax());
  }
}
