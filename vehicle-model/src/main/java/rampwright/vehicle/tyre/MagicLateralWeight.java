package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * How longitudinal slip weighs the lateral force down: Pacejka, <i>Tire and Vehicle Dynamics</i>,
 * 3rd ed. 2012, equations 4.E58 to 4.E67 for an upright wheel, with the book's coefficient names.
 *
 * <pre>
 *   Fy = Gyk Fy0 + SVyk   Gyk = W(kappa + SHyk)/W(SHyk)   W(x) = cos(Cyk atan(u - Eyk (u - atan u)))
 *   u = Byk x             Byk = rBy1 cos(atan(rBy2 (alpha* - rBy3)))
 *   Cyk = rCy1            Eyk = rEy1 + rEy2 dfz, at most 1         SHyk = rHy1 + rHy2 dfz
 *   SVyk = muy Fz (rVy1 + rVy2 dfz) cos(atan(rVy4 alpha*)) sin(rVy5 atan(rVy6 kappa))
 * </pre>
 *
 * @param rBy1 stiffness (-)
 * @param rBy2 its fall with side slip (-)
 * @param rBy3 side slip at which it is largest (-)
 * @param rCy1 shape (-)
 * @param rEy1 curvature at nominal load (-)
 * @param rEy2 its change with load (-)
 * @param rHy1 shift at nominal load (-)
 * @param rHy2 its change with load (-)
 * @param rVy1 side force from longitudinal slip over friction (-)
 * @param rVy2 its change with load (-)
 * @param rVy4 its fall with side slip (-)
 * @param rVy5 its shape over longitudinal slip (-)
 * @param rVy6 its stiffness over longitudinal slip (-)
 */
public record MagicLateralWeight(
    double rBy1,
    double rBy2,
    double rBy3,
    double rCy1,
    double rEy1,
    double rEy2,
    double rHy1,
    double rHy2,
    double rVy1,
    double rVy2,
    double rVy4,
    double rVy5,
    double rVy6) {
  public static final Quantity RBY1 = MagicFormulaTyre.stiffness("rBy1");
  public static final Quantity RBY2 = MagicFormulaTyre.coefficient("rBy2");
  public static final Quantity RBY3 = MagicFormulaTyre.shift("rBy3");
  public static final Quantity RCY1 = MagicFormulaTyre.weightShape("rCy1");
  public static final Quantity REY1 = MagicFormulaTyre.coefficient("rEy1");
  public static final Quantity REY2 = MagicFormulaTyre.coefficient("rEy2");
  public static final Quantity RHY1 = MagicFormulaTyre.shift("rHy1");
  public static final Quantity RHY2 = MagicFormulaTyre.shift("rHy2");
  public static final Quantity RVY1 = MagicFormulaTyre.shift("rVy1");
  public static final Quantity RVY2 = MagicFormulaTyre.shift("rVy2");
  public static final Quantity RVY4 = MagicFormulaTyre.coefficient("rVy4");
  public static final Quantity RVY5 = MagicFormulaTyre.coefficient("rVy5");
  public static final Quantity RVY6 = MagicFormulaTyre.coefficient("rVy6");

  /** Checks every value. */
  public MagicLateralWeight {
    RBY1.check(rBy1);
    RBY2.check(rBy2);
    RBY3.check(rBy3);
    RCY1.check(rCy1);
    REY1.check(rEy1);
    REY2.check(rEy2);
    RHY1.check(rHy1);
    RHY2.check(rHy2);
    RVY1.check(rVy1);
    RVY2.check(rVy2);
    RVY4.check(rVy4);
    RVY5.check(rVy5);
    RVY6.check(rVy6);
  }

  /** Returns these coefficients without what tells left from right. */
  MagicLateralWeight centred() {
    return new MagicLateralWeight(
        rBy1, rBy2, 0, rCy1, rEy1, rEy2, rHy1, rHy2, 0, 0, rVy4, rVy5, rVy6);
  }

  /** Weighs the pure force down; partials with side slip are those with {@code alpha*}. */
  void apply(double dfz, double perNominal, double kappa, double tangent, TyreForces out) {
    double steep = rBy2 * (tangent - rBy3);
    double b = rBy1 / Math.sqrt(1 + steep * steep);
    double bTangent = -b * steep * rBy2 / (1 + steep * steep);
    double e = rEy1 + rEy2 * dfz;
    double eLoad = rEy2 * perNominal;
    if (e > 1) {
      e = 1;
      eLoad = 0;
    }
    double shift = rHy1 + rHy2 * dfz;
    double x = kappa + shift;
    double rest = MagicCurve.weight(b * shift, rCy1, e);
    double weight = MagicCurve.weight(b * x, rCy1, e) / rest;
    double byU = MagicCurve.weightByU(b * x, rCy1, e) / rest;
    double restByU = weight * MagicCurve.weightByU(b * shift, rCy1, e) / rest;
    double byE =
        MagicCurve.weightByCurvature(b * x, rCy1, e) / rest
            - weight * MagicCurve.weightByCurvature(b * shift, rCy1, e) / rest;
    double byLoad = byE * eLoad + (byU - restByU) * b * rHy2 * perNominal;
    double pure = out.fy;
    out.fy = weight * pure;
    out.fySlip = byU * b * pure;
    out.fyAngle = weight * out.fyAngle + (byU * x - restByU * shift) * bTangent * pure;
    out.fyLoad = weight * out.fyLoad + byLoad * pure;
  }

  /**
   * Adds the side force from longitudinal slip.
   *
   * @param limit friction times load (N) with the sign of the friction
   * @param limitLoad its derivative with load (-)
   */
  void addSideForce(
      double limit,
      double limitLoad,
      double dfz,
      double perNominal,
      double kappa,
      double tangent,
      TyreForces out) {
    double share = rVy1 + rVy2 * dfz;
    double steep = rVy4 * tangent;
    double fall = 1 / Math.sqrt(1 + steep * steep);
    double angle = rVy5 * Math.atan(rVy6 * kappa);
    double sine = Math.sin(angle);
    double slope = Math.cos(angle) * rVy5 * rVy6 / (1 + rVy6 * kappa * rVy6 * kappa);
    out.fy += limit * share * fall * sine;
    out.fySlip += limit * share * fall * slope;
    out.fyAngle -= limit * share * fall * fall * fall * steep * rVy4 * sine;
    out.fyLoad += (limitLoad * share + limit * rVy2 * perNominal) * fall * sine;
  }
}
