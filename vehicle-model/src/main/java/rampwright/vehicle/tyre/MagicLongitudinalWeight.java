package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * How side slip weighs the longitudinal force down: Pacejka, <i>Tire and Vehicle Dynamics</i>, 3rd
 * ed. 2012, equations 4.E50 to 4.E57 for an upright wheel, with the book's coefficient names.
 *
 * <pre>
 *   Fx = Gxa Fx0      Gxa = W(alpha* + SHxa)/W(SHxa)      W(x) = cos(Cxa atan(u - Exa (u - atan u)))
 *   u = Bxa x         Bxa = rBx1 cos(atan(rBx2 kappa))
 *   Cxa = rCx1        Exa = rEx1 + rEx2 dfz, at most 1    SHxa = rHx1
 * </pre>
 *
 * @param rBx1 stiffness (-)
 * @param rBx2 its fall with longitudinal slip (-)
 * @param rCx1 shape (-)
 * @param rEx1 curvature at nominal load (-)
 * @param rEx2 its change with load (-)
 * @param rHx1 shift (-)
 */
public record MagicLongitudinalWeight(
    double rBx1, double rBx2, double rCx1, double rEx1, double rEx2, double rHx1) {
  public static final Quantity RBX1 = MagicFormulaTyre.stiffness("rBx1");
  public static final Quantity RBX2 = MagicFormulaTyre.coefficient("rBx2");
  public static final Quantity RCX1 = MagicFormulaTyre.weightShape("rCx1");
  public static final Quantity REX1 = MagicFormulaTyre.coefficient("rEx1");
  public static final Quantity REX2 = MagicFormulaTyre.coefficient("rEx2");
  public static final Quantity RHX1 = MagicFormulaTyre.shift("rHx1");

  /** Checks every value. */
  public MagicLongitudinalWeight {
    RBX1.check(rBx1);
    RBX2.check(rBx2);
    RCX1.check(rCx1);
    REX1.check(rEx1);
    REX2.check(rEx2);
    RHX1.check(rHx1);
  }

  /** Returns these coefficients without what tells left from right. */
  MagicLongitudinalWeight centred() {
    return new MagicLongitudinalWeight(rBx1, rBx2, rCx1, rEx1, rEx2, 0);
  }

  /** Weighs the pure force down; the partial with side slip is the one with {@code alpha*}. */
  void apply(double dfz, double perNominal, double kappa, double tangent, TyreForces out) {
    double steep = rBx2 * kappa;
    double b = rBx1 / Math.sqrt(1 + steep * steep);
    double bSlip = -b * steep * rBx2 / (1 + steep * steep);
    double e = rEx1 + rEx2 * dfz;
    double eLoad = rEx2 * perNominal;
    if (e > 1) {
      e = 1;
      eLoad = 0;
    }
    double x = tangent + rHx1;
    double rest = MagicCurve.weight(b * rHx1, rCx1, e);
    double weight = MagicCurve.weight(b * x, rCx1, e) / rest;
    double byU = MagicCurve.weightByU(b * x, rCx1, e) / rest;
    double restByU = MagicCurve.weightByU(b * rHx1, rCx1, e) / rest;
    double byE =
        MagicCurve.weightByCurvature(b * x, rCx1, e) / rest
            - weight * MagicCurve.weightByCurvature(b * rHx1, rCx1, e) / rest;
    double pure = out.fx;
    out.fx = weight * pure;
    out.fxSlip = weight * out.fxSlip + (byU * x - weight * restByU * rHx1) * bSlip * pure;
    out.fxLoad = weight * out.fxLoad + byE * eLoad * pure;
    out.fxAngle = byU * b * pure;
  }
}
