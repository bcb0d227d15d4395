package rampwright.vehicle.tyre;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Lateral force at pure side slip: Pacejka, <i>Tire and Vehicle Dynamics</i>, 3rd ed. 2012,
 * equations 4.E19 to 4.E30 for an upright wheel at nominal pressure, with the book's coefficient
 * names, {@code alpha* = tan(alpha)} and {@code dfz = (Fz - Fz0)/Fz0}.
 *
 * <pre>
 *   Fy0 = Dy sin(Cy atan(By ay - Ey (By ay - atan(By ay)))) + SVy       ay = alpha* + SHy
 *   Cy = pCy1                        Dy = muy Fz        muy = (pDy1 + pDy2 dfz) grip
 *   Ey = (pEy1 + pEy2 dfz)(1 - pEy3 sgn(ay))                             at most 1
 *   By Cy Dy = pKy1 Fz0 sin(pKy4 atan(Fz / (pKy2 Fz0)))
 *   SHy = pHy1 + pHy2 dfz            SVy = Fz (pVy1 + pVy2 dfz) grip
 * </pre>
 *
 * Signs are those of ISO 8855: {@code pKy1} is negative; {@code pDy1} may have either sign.
 *
 * @param pCy1 shape factor (-)
 * @param pDy1 friction at nominal load (-)
 * @param pDy2 change of friction with load (-)
 * @param pEy1 curvature factor at nominal load (-)
 * @param pEy2 its change with load (-)
 * @param pEy3 its change with the sign of the slip angle (-)
 * @param pKy1 largest cornering stiffness over nominal load (1/rad)
 * @param pKy2 load over nominal load at which the stiffness is largest (-)
 * @param pKy4 shape of the stiffness over load (-), 2 in most sets
 * @param pHy1 horizontal shift at nominal load (-)
 * @param pHy2 its change with load (-)
 * @param pVy1 vertical shift over load at nominal load (-)
 * @param pVy2 its change with load (-)
 */
public record MagicLateral(
    double pCy1,
    double pDy1,
    double pDy2,
    double pEy1,
    double pEy2,
    double pEy3,
    double pKy1,
    double pKy2,
    double pKy4,
    double pHy1,
    double pHy2,
    double pVy1,
    double pVy2) {
  public static final Quantity PCY1 = MagicFormulaTyre.shape("pCy1");
  public static final Quantity PDY1 =
      Quantity.si("pDy1", "coefficient pDy1", "", -5, 5, "it was given in percent");
  public static final Quantity PDY2 = MagicFormulaTyre.coefficient("pDy2");
  public static final Quantity PEY1 = MagicFormulaTyre.coefficient("pEy1");
  public static final Quantity PEY2 = MagicFormulaTyre.coefficient("pEy2");
  public static final Quantity PEY3 = MagicFormulaTyre.coefficient("pEy3");
  public static final Quantity PKY1 =
      Quantity.si("pKy1", "coefficient pKy1", "", -500, -1, "the signs are not those of ISO 8855");
  public static final Quantity PKY2 = Quantity.si("pKy2", "coefficient pKy2", "", 0.1, 50, "");
  public static final Quantity PKY4 = Quantity.si("pKy4", "coefficient pKy4", "", 0.5, 2.05, "");
  public static final Quantity PHY1 = MagicFormulaTyre.shift("pHy1");
  public static final Quantity PHY2 = MagicFormulaTyre.shift("pHy2");
  public static final Quantity PVY1 = MagicFormulaTyre.shift("pVy1");
  public static final Quantity PVY2 = MagicFormulaTyre.shift("pVy2");

  /** Below this argument the quotient of the stiffness is taken from its series. */
  private static final double SMALL = 1e-3;

  /** Checks every value. */
  public MagicLateral {
    PCY1.check(pCy1);
    PDY1.check(pDy1);
    PDY2.check(pDy2);
    PEY1.check(pEy1);
    PEY2.check(pEy2);
    PEY3.check(pEy3);
    PKY1.check(pKy1);
    PKY2.check(pKy2);
    PKY4.check(pKy4);
    PHY1.check(pHy1);
    PHY2.check(pHy2);
    PVY1.check(pVy1);
    PVY2.check(pVy2);
    if (Math.abs(pDy1) < 0.05) {
      throw InvalidInput.value(PDY1.label(), pDy1, "", "at least 0.05 in size", "");
    }
  }

  /** Returns these coefficients without what tells left from right. */
  MagicLateral centred() {
    return new MagicLateral(pCy1, pDy1, pDy2, pEy1, pEy2, 0, pKy1, pKy2, pKy4, 0, 0, 0, 0);
  }

  /** Returns the friction at a load, with the sign of the set. */
  double friction(double dfz) {
    double mu = pDy1 + pDy2 * dfz;
    double sign = Math.signum(pDy1);
    return sign * mu < MagicFormulaTyre.LEAST_FRICTION
        ? sign * MagicFormulaTyre.LEAST_FRICTION
        : mu;
  }

  /** Returns the derivative of {@link #friction} with load (1/N). */
  double frictionByLoad(double dfz, double perNominal) {
    boolean floored = Math.signum(pDy1) * (pDy1 + pDy2 * dfz) < MagicFormulaTyre.LEAST_FRICTION;
    return floored ? 0 : pDy2 * perNominal;
  }

  /**
   * Stores the pure force with its partials with {@code alpha*} and load; the former stands in
   * {@link TyreForces#fyAngle} until the caller turns it into the one with the angle.
   */
  void evaluate(
      double load, double dfz, double perNominal, double tangent, double grip, TyreForces out) {
    double mu = friction(dfz);
    double muLoad = frictionByLoad(dfz, perNominal);
    double q = load * perNominal / pKy2;
    double quotient = quotient(q);
    double x = tangent + pHy1 + pHy2 * dfz;
    double b = pKy1 / pKy2 * quotient / (pCy1 * mu * grip);
    double bLoad = b * (quotientSlope(q, quotient) / quotient * perNominal / pKy2 - muLoad / mu);
    double asymmetry = 1 - pEy3 * Math.signum(x);
    double e = (pEy1 + pEy2 * dfz) * asymmetry;
    double eLoad = pEy2 * asymmetry * perNominal;
    if (e > 1) {
      e = 1;
      eLoad = 0;
    }
    double u = b * x;
    double w = MagicCurve.argument(u, e);
    double angle = pCy1 * Math.atan(w);
    double sine = Math.sin(angle);
    double d = mu * load * grip;
    double byW = d * pCy1 * Math.cos(angle) / (1 + w * w);
    double byU = byW * MagicCurve.argumentSlope(u, e);
    double uLoad = bLoad * x + b * pHy2 * perNominal;
    double shift = (pVy1 + pVy2 * dfz) * grip;
    out.fy = d * sine + load * shift;
    out.fyAngle = byU * b;
    out.fyLoad =
        (mu + muLoad * load) * grip * sine
            + byU * uLoad
            + byW * MagicCurve.argumentByCurvature(u) * eLoad
            + shift
            + load * pVy2 * perNominal * grip;
  }

  /** Cornering stiffness over load falls from its value at zero load: {@code sin(c atan q)/q}. */
  private double quotient(double q) {
    if (q < SMALL) {
      return pKy4 - (pKy4 / 3 + pKy4 * pKy4 * pKy4 / 6) * q * q;
    }
    return Math.max(Math.sin(pKy4 * Math.atan(q)), 1e-3) / q;
  }

  private double quotientSlope(double q, double quotient) {
    if (q < SMALL) {
      return -2 * (pKy4 / 3 + pKy4 * pKy4 * pKy4 / 6) * q;
    }
    double angle = pKy4 * Math.atan(q);
    double slope = Math.sin(angle) > 1e-3 ? pKy4 * Math.cos(angle) / (1 + q * q) : 0;
    return (slope - quotient) / q;
  }

  /** Returns the slip angle (rad, positive) at the peak at grip 1. */
  double slipAngleAtPeak(double load, double dfz, double perNominal) {
    double b = Math.abs(pKy1 / pKy2 * quotient(load * perNominal / pKy2) / (pCy1 * friction(dfz)));
    double e = Math.min(1, (pEy1 + pEy2 * dfz) * (1 - pEy3));
    double peak = MagicCurve.peak(pCy1, e, b * MagicFormulaTyre.LARGEST_PEAK_SLIP) / b;
    return Math.atan(peak - (pHy1 + pHy2 * dfz));
  }
}
