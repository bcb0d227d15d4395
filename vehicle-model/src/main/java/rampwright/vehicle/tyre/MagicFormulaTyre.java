package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * Magic Formula tyre, steady state, pure and combined slip, for whoever has the coefficients:
 * Pacejka, <i>Tire and Vehicle Dynamics</i>, 3rd ed. 2012, section 4.3.2, with the book's
 * coefficient names.
 *
 * <p>Limits: upright wheel, nominal pressure, no aligning or overturning moment, no rolling
 * resistance, all scaling factors 1. The grip of the road is the book's {@code lambda_mu}: it
 * scales friction and vertical shifts, not the slip stiffness, so that peaks come earlier on a
 * slippery road. Friction is not below {@link #LEAST_FRICTION}; side slip enters as {@code alpha* =
 * tan(alpha)}, continued in proportion to the angle beyond {@link #LARGEST_ANGLE}.
 *
 * <p>A measured set carries shifts: a rolling wheel without slip then has forces. That has no place
 * in a car here: its free wheels roll without slip, it runs straight with its steering straight,
 * and a left turn is the mirror image of a right turn. A car therefore takes {@link #centred}; the
 * full set is for comparison with printed values.
 *
 * @param nominalLoad {@code Fz0} (N)
 * @param longitudinal force at pure longitudinal slip
 * @param lateral force at pure side slip
 * @param longitudinalWeight how side slip weighs the longitudinal force down
 * @param lateralWeight how longitudinal slip weighs the lateral force down
 */
public record MagicFormulaTyre(
    double nominalLoad,
    MagicLongitudinal longitudinal,
    MagicLateral lateral,
    MagicLongitudinalWeight longitudinalWeight,
    MagicLateralWeight lateralWeight)
    implements Tyre {
  public static final Quantity NOMINAL_LOAD =
      Quantity.si("nominal_load_n", "nominal load", "N", 50, 1e5, "the value is in kN");

  /** Friction never falls below this value, whatever the load (-). */
  static final double LEAST_FRICTION = 0.2;

  /** Slip stiffness over load never falls below this value (-). */
  static final double LEAST_STIFFNESS = 1;

  /** A curve that peaks beyond this slip counts as peaking there (-). */
  static final double LARGEST_PEAK_SLIP = 1;

  /** Slip angle (rad) up to which its tangent is taken. */
  static final double LARGEST_ANGLE = 1.3;

  /** Checks the nominal load. */
  public MagicFormulaTyre {
    NOMINAL_LOAD.check(nominalLoad);
  }

  static Quantity coefficient(String name) {
    return Quantity.si(name, "coefficient " + name, "", -1000, 1000, "");
  }

  static Quantity shape(String name) {
    return Quantity.si(name, "coefficient " + name, "", 0.5, 2.4, "");
  }

  static Quantity weightShape(String name) {
    return Quantity.si(name, "coefficient " + name, "", 0.5, 1.5, "");
  }

  static Quantity stiffness(String name) {
    return Quantity.si(name, "coefficient " + name, "", 0, 500, "");
  }

  static Quantity shift(String name) {
    return Quantity.si(name, "coefficient " + name, "", -1, 1, "it was given in percent");
  }

  /**
   * Returns the tyre without the shifts and asymmetries that tell left from right or driving from
   * rolling: no slip means no force, and a slip angle of the other sign the opposite lateral force.
   * What differs between driving and braking stays.
   */
  public MagicFormulaTyre centred() {
    return new MagicFormulaTyre(
        nominalLoad,
        longitudinal.centred(),
        lateral.centred(),
        longitudinalWeight.centred(),
        lateralWeight.centred());
  }

  @Override
  public void evaluate(double load, double slip, double slipAngle, double grip, TyreForces out) {
    double perNominal = 1 / nominalLoad;
    double dfz = load * perNominal - 1;
    double within = Math.max(-LARGEST_ANGLE, Math.min(LARGEST_ANGLE, slipAngle));
    double tangent = Math.tan(within);
    double tangentSlope = 1 + tangent * tangent;
    tangent += tangentSlope * (slipAngle - within);
    longitudinal.evaluate(load, dfz, perNominal, slip, grip, out);
    longitudinalWeight.apply(dfz, perNominal, slip, tangent, out);
    lateral.evaluate(load, dfz, perNominal, tangent, grip, out);
    lateralWeight.apply(dfz, perNominal, slip, tangent, out);
    double friction = lateral.friction(dfz);
    double frictionLoad = lateral.frictionByLoad(dfz, perNominal);
    lateralWeight.addSideForce(
        friction * load * grip,
        (friction + frictionLoad * load) * grip,
        dfz,
        perNominal,
        slip,
        tangent,
        out);
    out.fxAngle *= tangentSlope;
    out.fyAngle *= tangentSlope;
  }

  @Override
  public double slipAtPeak(double load) {
    return longitudinal.slipAtPeak(load / nominalLoad - 1);
  }

  @Override
  public double slipAngleAtPeak(double load) {
    return lateral.slipAngleAtPeak(load, load / nominalLoad - 1, 1 / nominalLoad);
  }
}
