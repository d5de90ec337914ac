package org.gasmargin.gas;

/** General hazards that rules can ask for. */
public enum Hazard {
  OXIDISER,
  FLAMMABLE,
  ASPHYXIANT,
  TOXIC
}
