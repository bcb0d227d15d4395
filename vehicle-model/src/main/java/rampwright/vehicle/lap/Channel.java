package rampwright.vehicle.lap;

/**
 * What a lap keeps at every station. The order is the storage order of {@link Trace}; wheel and
 * differential channels stand in blocks so that they can be addressed by wheel or position.
 */
public enum Channel {
  DISTANCE("distance", "m"),
  TIME("time", "s"),
  SPEED("speed", "m/s"),
  CURVATURE("curvature", "1/m"),
  CURVATURE_GRADIENT("curvature gradient", "1/m²"),
  AX("longitudinal acceleration", "m/s²"),
  AY("lateral acceleration", "m/s²"),
  SIDESLIP("sideslip angle", "rad"),
  STEER("road-wheel steer angle", "rad"),
  CAGE_TORQUE("cage torque", "N·m"),
  FULL_TORQUE("cage torque available", "N·m"),
  BRAKE_TORQUE("total brake torque", "N·m"),
  GEAR("gear", ""),
  LIMIT("limit", ""),
  SIGMA("slide growth rate", "1/s"),
  CONTROL("control", ""),
  YAW_MOMENT("differential yaw moment", "N·m"),
  FRONT_CAGE_TORQUE("front cage torque", "N·m"),
  FRONT_TORQUE_DIFFERENCE("front torque difference", "N·m"),
  FRONT_SPEED_DIFFERENCE("front output speed difference", "rad/s"),
  FRONT_CAPACITY("front friction capacity", "N·m"),
  CENTRE_CAGE_TORQUE("centre cage torque", "N·m"),
  CENTRE_TORQUE_DIFFERENCE("centre torque difference", "N·m"),
  CENTRE_SPEED_DIFFERENCE("centre output speed difference", "rad/s"),
  CENTRE_CAPACITY("centre friction capacity", "N·m"),
  REAR_CAGE_TORQUE("rear cage torque", "N·m"),
  REAR_TORQUE_DIFFERENCE("rear torque difference", "N·m"),
  REAR_SPEED_DIFFERENCE("rear output speed difference", "rad/s"),
  REAR_CAPACITY("rear friction capacity", "N·m"),
  FX_FL("longitudinal force FL", "N"),
  FX_FR("longitudinal force FR", "N"),
  FX_RL("longitudinal force RL", "N"),
  FX_RR("longitudinal force RR", "N"),
  FY_FL("lateral force FL", "N"),
  FY_FR("lateral force FR", "N"),
  FY_RL("lateral force RL", "N"),
  FY_RR("lateral force RR", "N"),
  FZ_FL("vertical load FL", "N"),
  FZ_FR("vertical load FR", "N"),
  FZ_RL("vertical load RL", "N"),
  FZ_RR("vertical load RR", "N"),
  SLIP_FL("longitudinal slip FL", ""),
  SLIP_FR("longitudinal slip FR", ""),
  SLIP_RL("longitudinal slip RL", ""),
  SLIP_RR("longitudinal slip RR", ""),
  SLIP_ANGLE_FL("slip angle FL", "rad"),
  SLIP_ANGLE_FR("slip angle FR", "rad"),
  SLIP_ANGLE_RL("slip angle RL", "rad"),
  SLIP_ANGLE_RR("slip angle RR", "rad"),
  WHEEL_SPEED_FL("wheel speed FL", "rad/s"),
  WHEEL_SPEED_FR("wheel speed FR", "rad/s"),
  WHEEL_SPEED_RL("wheel speed RL", "rad/s"),
  WHEEL_SPEED_RR("wheel speed RR", "rad/s");

  private final String label;
  private final String unit;

  Channel(String label, String unit) {
    this.label = label;
    this.unit = unit;
  }

  /** Returns the words for people. */
  public String label() {
    return label;
  }

  /** Returns the SI unit, empty for a pure number. */
  public String unit() {
    return unit;
  }
}
