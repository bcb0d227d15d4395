package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * Longitudinal force at pure longitudinal slip: Pacejka, <i>Tire and Vehicle Dynamics</i>, 3rd ed.
 * 2012, equations 4.E9 to 4.E18 for an upright wheel at nominal pressure, with the book's
 * coefficient names and {@code dfz = (Fz - Fz0)/Fz0}.
 *
 * <pre>
 *   Fx0 = Dx sin(Cx atan(Bx kx - Ex (Bx kx - atan(Bx kx)))) + SVx       kx = kappa + SHx
 *   Cx = pCx1                        Dx = mux Fz        mux = (pDx1 + pDx2 dfz) grip
 *   Ex = (pEx1 + pEx2 dfz + pEx3 dfz²)(1 - pEx4 sgn(kx))                 at most 1
 *   Bx Cx Dx = Fz (pKx1 + pKx2 dfz) exp(pKx3 dfz)
 *   SHx = pHx1 + pHx2 dfz            SVx = Fz (pVx1 + pVx2 dfz) grip
 * </pre>
 *
 * @param pCx1 shape factor (-)
 * @param pDx1 friction at nominal load (-)
 * @param pDx2 change of friction with load (-)
 * @param pEx1 curvature factor at nominal load (-)
 * @param pEx2 its change with load (-)
 * @param pEx3 its change with load squared (-)
 * @param pEx4 its change between driving and braking (-)
 * @param pKx1 slip stiffness over load at nominal load (-)
 * @param pKx2 its change with load (-)
 * @param pKx3 exponent of its change with load (-)
 * @param pHx1 horizontal shift at nominal load (-)
 * @param pHx2 its change with load (-)
 * @param pVx1 vertical shift over load at nominal load (-)
 * @param pVx2 its change with load (-)
 */
public record MagicLongitudinal(
    double pCx1,
    double pDx1,
    double pDx2,
    double pEx1,
    double pEx2,
    double pEx3,
    double pEx4,
    double pKx1,
    double pKx2,
    double pKx3,
    double pHx1,
    double pHx2,
    double pVx1,
    double pVx2) {
  public static final Quantity PCX1 = MagicFormulaTyre.shape("pCx1");
  public static final Quantity PDX1 =
      Quantity.si("pDx1", "coefficient pDx1", "", 0.05, 5, "the signs are not those of ISO 8855");
  public static final Quantity PDX2 = MagicFormulaTyre.coefficient("pDx2");
  public static final Quantity PEX1 = MagicFormulaTyre.coefficient("pEx1");
  public static final Quantity PEX2 = MagicFormulaTyre.coefficient("pEx2");
  public static final Quantity PEX3 = MagicFormulaTyre.coefficient("pEx3");
  public static final Quantity PEX4 = MagicFormulaTyre.coefficient("pEx4");
  public static final Quantity PKX1 =
      Quantity.si("pKx1", "coefficient pKx1", "", 1, 500, "the signs are not those of ISO 8855");
  public static final Quantity PKX2 = MagicFormulaTyre.coefficient("pKx2");
  public static final Quantity PKX3 = MagicFormulaTyre.coefficient("pKx3");
  public static final Quantity PHX1 = MagicFormulaTyre.shift("pHx1");
  public static final Quantity PHX2 = MagicFormulaTyre.shift("pHx2");
  public static final Quantity PVX1 = MagicFormulaTyre.shift("pVx1");
  public static final Quantity PVX2 = MagicFormulaTyre.shift("pVx2");

  /** Checks every value. */
  public MagicLongitudinal {
    PCX1.check(pCx1);
    PDX1.check(pDx1);
    PDX2.check(pDx2);
    PEX1.check(pEx1);
    PEX2.check(pEx2);
    PEX3.check(pEx3);
    PEX4.check(pEx4);
    PKX1.check(pKx1);
    PKX2.check(pKx2);
    PKX3.check(pKx3);
    PHX1.check(pHx1);
    PHX2.check(pHx2);
    PVX1.check(pVx1);
    PVX2.check(pVx2);
  }

  /** Returns these coefficients without the shifts, so that no slip means no force. */
  MagicLongitudinal centred() {
    return new MagicLongitudinal(
        pCx1, pDx1, pDx2, pEx1, pEx2, pEx3, pEx4, pKx1, pKx2, pKx3, 0, 0, 0, 0);
  }

  /** Stores the pure force with its partials with slip and load. */
  void evaluate(
      double load, double dfz, double perNominal, double kappa, double grip, TyreForces out) {
    double mu = pDx1 + pDx2 * dfz;
    double muLoad = pDx2 * perNominal;
    if (mu < MagicFormulaTyre.LEAST_FRICTION) {
      mu = MagicFormulaTyre.LEAST_FRICTION;
      muLoad = 0;
    }
    double growth = Math.exp(pKx3 * dfz);
    double stiffness = (pKx1 + pKx2 * dfz) * growth;
    double stiffnessLoad = (pKx2 * growth + pKx3 * stiffness) * perNominal;
    if (stiffness < MagicFormulaTyre.LEAST_STIFFNESS) {
      stiffness = MagicFormulaTyre.LEAST_STIFFNESS;
      stiffnessLoad = 0;
    }
    double x = kappa + pHx1 + pHx2 * dfz;
    double b = stiffness / (pCx1 * mu * grip);
    double bLoad = b * (stiffnessLoad / stiffness - muLoad / mu);
    double asymmetry = 1 - pEx4 * Math.signum(x);
    double e = curvature(dfz, asymmetry);
    double eLoad = (pEx2 + 2 * pEx3 * dfz) * asymmetry * perNominal;
    if (e > 1) {
      e = 1;
      eLoad = 0;
    }
    double u = b * x;
    double w = MagicCurve.argument(u, e);
    double angle = pCx1 * Math.atan(w);
    double sine = Math.sin(angle);
    double d = mu * load * grip;
    double byU = d * pCx1 * Math.cos(angle) / (1 + w * w) * MagicCurve.argumentSlope(u, e);
    double byE = d * pCx1 * Math.cos(angle) / (1 + w * w) * MagicCurve.argumentByCurvature(u);
    double uLoad = bLoad * x + b * pHx2 * perNominal;
    double shift = (pVx1 + pVx2 * dfz) * grip;
    out.fx = d * sine + load * shift;
    out.fxSlip = byU * b;
    out.fxLoad =
        (mu + muLoad * load) * grip * sine
            + byU * uLoad
            + byE * eLoad
            + shift
            + load * pVx2 * perNominal * grip;
  }

  private double curvature(double dfz, double asymmetry) {
    return (pEx1 + (pEx2 + pEx3 * dfz) * dfz) * asymmetry;
  }

  /** Returns the driving slip at the peak at grip 1. */
  double slipAtPeak(double dfz) {
    double mu = Math.max(MagicFormulaTyre.LEAST_FRICTION, pDx1 + pDx2 * dfz);
    double stiffness =
        Math.max(MagicFormulaTyre.LEAST_STIFFNESS, (pKx1 + pKx2 * dfz) * Math.exp(pKx3 * dfz));
    double b = stiffness / (pCx1 * mu);
    double e = Math.min(1, curvature(dfz, 1 - pEx4));
    return MagicCurve.peak(pCx1, e, b * MagicFormulaTyre.LARGEST_PEAK_SLIP) / b
        - (pHx1 + pHx2 * dfz);
  }
}
