package org.gasmargin.process;

import java.util.OptionalDouble;
import org.gasmargin.units.Interval;

/** One step of a procedure, acting on one vessel. */
public sealed interface Step {

  /** Identifier, unique in the job: the step's number from 1, or the user's own name for it. */
  String id();

  /** Name of the vessel that the step acts on. */
  String vessel();

  /** The word of the job file for this kind of step. */
  String kind();

  /**
   * Gas flows in from a constant supply.
   *
   * @param supply where it comes from
   * @param drive what sets the flow
   * @param inletDiameter bore from which the jet enters, m, if known
   */
  record Fill(String id, String vessel, Supply supply, Drive drive, OptionalDouble inletDiameter)
      implements Step {
    @Override
    public String kind() {
      return "fill";
    }
  }

  /**
   * Gas flows out to the atmosphere.
   *
   * @param drive what sets the flow
   */
  record Vent(String id, String vessel, Drive drive) implements Step {
    @Override
    public String kind() {
      return "vent";
    }
  }

  /**
   * The vessel stays closed.
   *
   * @param duration s
   */
  record Hold(String id, String vessel, double duration) implements Step {
    @Override
    public String kind() {
      return "hold";
    }
  }

  /**
   * Gas trapped in a closed end is compressed by gas that rushes in behind it, without mixing.
   *
   * @param until end pressure, Pa absolute
   * @param within time of the pressure rise, s
   */
  record Compress(String id, String vessel, Interval until, double within) implements Step {
    @Override
    public String kind() {
      return "compress";
    }
  }
}
