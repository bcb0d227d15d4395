package rampwright.vehicle.tyre;

/** Published coefficient sets, upright wheel. */
final class PublishedMagicTyres {
  private PublishedMagicTyres() {}

  /**
   * Tyre 205/60R15 91V at 2.2 bar: Pacejka, Tyre and Vehicle Dynamics, 2nd ed. 2006, App. 3 Table
   * A3.1, as four independent public transcriptions have it.
   */
  static MagicFormulaTyre secondEdition() {
    return new MagicFormulaTyre(
        4000,
        new MagicLongitudinal(
            1.685, 1.210, -0.037, 0.344, 0.095, -0.020, 0, 21.51, -0.163, 0.245, -0.002, 0.002, 0,
            0),
        new MagicLateral(
            1.193, -0.990, 0.145, -1.003, -0.537, -0.083, -14.95, 2.130, 2, 0.003, -0.001, 0.045,
            -0.024),
        new MagicLongitudinalWeight(12.35, -10.77, 1.092, 0, 0, 0.007),
        new MagicLateralWeight(
            6.461, 4.196, -0.015, 1.081, 0, 0, 0.009, 0, 0.053, -0.073, 35.44, 1.9, -10.71));
  }

  /**
   * Tyre of the third edition's family (from memory: its Appendix 3, 2012), as the sample file of a
   * general-purpose public library has it.
   */
  static MagicFormulaTyre thirdEdition() {
    return new MagicFormulaTyre(
        4000,
        new MagicLongitudinal(
            1.579,
            1.0422,
            -0.08285,
            0.11113,
            0.3143,
            0,
            0.001719,
            21.687,
            13.728,
            -0.4098,
            2.1615e-4,
            0.0011598,
            2.20283e-5,
            1.0568e-4),
        new MagicLateral(
            1.337, 0.8785, -0.06452, -0.8057, -0.6046, 0.09854, -15.324, 1.715, 2.0005, -0.001806,
            0.00352, -0.00661, 0.03592),
        new MagicLongitudinalWeight(13.046, 9.718, 0.9995, -0.4403, -0.4663, -9.968e-5),
        new MagicLateralWeight(
            10.622, 7.82, 0.002037, 1.0587, 0.3148, 0.004867, 0.009472, 0.009754, 0.05187, 4.853e-4,
            94.63, 1.8914, 23.8));
  }
}
