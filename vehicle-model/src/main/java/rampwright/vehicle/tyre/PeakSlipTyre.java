package rampwright.vehicle.tyre;

import rampwright.vehicle.input.InvalidInput;

/**
 * Tyre described by its peaks at two loads, with combined slip by similarity.
 *
 * <pre>
 *   sn = s / sPeak(Fz)    an = -alpha / alphaPeak(Fz)    rho = sqrt(sn² + an²)
 *   Fx = grip muX(Fz) Fz sin(Qx atan(Sx rho)) sn/rho
 *   Fy = grip muY(Fz) Fz sin(Qy atan(Sy rho)) an/rho
 * </pre>
 *
 * Friction and slip at the peak are linear in load between the two loads and beyond them, but
 * friction is not below {@link #LEAST_FRICTION} and slip at the peak not below {@link #LEAST_SLIP}.
 * No camber, no aligning moment, no shift of the curves at zero slip.
 *
 * <p>Source: Kelly, <i>Lap Time Simulation with Transient Vehicle and Tyre Dynamics</i>, PhD
 * thesis, Cranfield 2008; Perantoni and Limebeer, <i>Optimal control for a Formula One car with
 * variable parameters</i>, Vehicle System Dynamics 52(5), 2014, Appendix A. Deviation: with {@link
 * SlipCurve#peakAtOne} the peak lies at the entered slip exactly; the paper's transcriptions peak
 * at 0.751 of it.
 *
 * @param light the peaks at the smaller load
 * @param heavy the peaks at the larger load
 * @param longitudinal shape of the longitudinal force
 * @param lateral shape of the lateral force
 */
public record PeakSlipTyre(
    PeakAtLoad light, PeakAtLoad heavy, SlipCurve longitudinal, SlipCurve lateral) implements Tyre {
  /** Friction never falls below this value, whatever the load (-). */
  public static final double LEAST_FRICTION = 0.2;

  /** Slip (-) and slip angle (rad) at the peak never fall below this value. */
  public static final double LEAST_SLIP = 0.02;

  /** Below this normalised slip the limits of the quotients are taken from their series. */
  private static final double SMALL = 1e-3;

  /** Rejects loads in the wrong order. */
  public PeakSlipTyre {
    if (!(heavy.load() > light.load())) {
      throw InvalidInput.value(
          "second tyre load",
          heavy.load(),
          "N",
          "above the first load of " + light.load() + " N",
          "the two were swapped");
    }
  }

  @Override
  public double slipAtPeak(double load) {
    return longitudinal.peak() * Math.max(LEAST_SLIP, linear(light.slip(), heavy.slip(), load));
  }

  @Override
  public double slipAngleAtPeak(double load) {
    return lateral.peak()
        * Math.max(LEAST_SLIP, linear(light.slipAngle(), heavy.slipAngle(), load));
  }

  @Override
  public void evaluate(double load, double slip, double slipAngle, double grip, TyreForces out) {
    double perNewton = 1 / (heavy.load() - light.load());
    double share = (load - light.load()) * perNewton;
    double muX = light.frictionX() + (heavy.frictionX() - light.frictionX()) * share;
    double muXLoad = (heavy.frictionX() - light.frictionX()) * perNewton;
    if (muX < LEAST_FRICTION) {
      muX = LEAST_FRICTION;
      muXLoad = 0;
    }
    double muY = light.frictionY() + (heavy.frictionY() - light.frictionY()) * share;
    double muYLoad = (heavy.frictionY() - light.frictionY()) * perNewton;
    if (muY < LEAST_FRICTION) {
      muY = LEAST_FRICTION;
      muYLoad = 0;
    }
    double peakS = light.slip() + (heavy.slip() - light.slip()) * share;
    double peakSLoad = (heavy.slip() - light.slip()) * perNewton;
    if (peakS < LEAST_SLIP) {
      peakS = LEAST_SLIP;
      peakSLoad = 0;
    }
    double peakA = light.slipAngle() + (heavy.slipAngle() - light.slipAngle()) * share;
    double peakALoad = (heavy.slipAngle() - light.slipAngle()) * perNewton;
    if (peakA < LEAST_SLIP) {
      peakA = LEAST_SLIP;
      peakALoad = 0;
    }

    double sn = slip / peakS;
    double an = -slipAngle / peakA;
    double rho2 = sn * sn + an * an;
    double rho = Math.sqrt(rho2);

    // g = sin(Q atan(S rho))/rho and h = (dg/drho)/rho, so that F = mu Fz g n, dF/dn = mu Fz (g + h
    // n²)
    double gX;
    double hX;
    double gY;
    double hY;
    if (rho < SMALL) {
      gX = smallG(longitudinal, rho2);
      hX = smallH(longitudinal);
      gY = smallG(lateral, rho2);
      hY = smallH(lateral);
    } else {
      double q = longitudinal.shape();
      double u = longitudinal.scale() * rho;
      double angle = q * Math.atan(u);
      gX = Math.sin(angle) / rho;
      hX = (Math.cos(angle) * q * longitudinal.scale() / (1 + u * u) - gX) / rho2;
      if (lateral.shape() == longitudinal.shape() && lateral.scale() == longitudinal.scale()) {
        gY = gX;
        hY = hX;
      } else {
        q = lateral.shape();
        u = lateral.scale() * rho;
        angle = q * Math.atan(u);
        gY = Math.sin(angle) / rho;
        hY = (Math.cos(angle) * q * lateral.scale() / (1 + u * u) - gY) / rho2;
      }
    }

    double limitX = grip * muX * load;
    double limitY = grip * muY * load;
    double fxSn = limitX * (gX + hX * sn * sn);
    double fxAn = limitX * hX * sn * an;
    double fySn = limitY * hY * sn * an;
    double fyAn = limitY * (gY + hY * an * an);
    double snLoad = -sn * peakSLoad / peakS;
    double anLoad = -an * peakALoad / peakA;
    out.fx = limitX * gX * sn;
    out.fy = limitY * gY * an;
    out.fxSlip = fxSn / peakS;
    out.fySlip = fySn / peakS;
    out.fxAngle = -fxAn / peakA;
    out.fyAngle = -fyAn / peakA;
    out.fxLoad = grip * (muX + muXLoad * load) * gX * sn + fxSn * snLoad + fxAn * anLoad;
    out.fyLoad = grip * (muY + muYLoad * load) * gY * an + fySn * snLoad + fyAn * anLoad;
  }

  private double linear(double atLight, double atHeavy, double load) {
    return atLight + (atHeavy - atLight) * (load - light.load()) / (heavy.load() - light.load());
  }

  private static double smallG(SlipCurve curve, double rho2) {
    return curve.shape() * curve.scale() + 0.5 * smallH(curve) * rho2;
  }

  private static double smallH(SlipCurve curve) {
    double q = curve.shape();
    double s = curve.scale();
    return -q * s * s * s * (2.0 / 3.0 + q * q / 3.0);
  }
}
