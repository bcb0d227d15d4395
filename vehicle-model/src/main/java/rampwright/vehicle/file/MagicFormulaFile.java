package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import rampwright.vehicle.tyre.MagicFormulaTyre;
import rampwright.vehicle.tyre.MagicLateral;
import rampwright.vehicle.tyre.MagicLateralWeight;
import rampwright.vehicle.tyre.MagicLongitudinal;
import rampwright.vehicle.tyre.MagicLongitudinalWeight;

/**
 * Magic Formula tyres as YAML, with the book's coefficient names as keys. Coefficients that only
 * refine may be left out. Shifts and left/right asymmetries may be given, as a full set has them,
 * but a car takes the tyre without them: see {@link MagicFormulaTyre#centred}.
 */
final class MagicFormulaFile {
  private static final String LONGITUDINAL_KEY = "longitudinal";
  private static final String LATERAL_KEY = "lateral";
  private static final String LONGITUDINAL_WEIGHT_KEY = "combined_longitudinal";
  private static final String LATERAL_WEIGHT_KEY = "combined_lateral";

  /** The stiffness falls again beyond its largest value, as the book's sets have it. */
  private static final double USUAL_PKY4 = 2;

  private static final Fields<MagicFormulaTyre> FIELDS =
      Fields.<MagicFormulaTyre>none()
          .with(MagicFormulaTyre.NOMINAL_LOAD, MagicFormulaTyre::nominalLoad);

  private static final Fields<MagicLongitudinal> LONGITUDINAL =
      Fields.<MagicLongitudinal>none()
          .with(MagicLongitudinal.PCX1, MagicLongitudinal::pCx1)
          .with(MagicLongitudinal.PDX1, MagicLongitudinal::pDx1)
          .with(MagicLongitudinal.PDX2, MagicLongitudinal::pDx2)
          .with(MagicLongitudinal.PEX1, MagicLongitudinal::pEx1)
          .with(MagicLongitudinal.PEX2, MagicLongitudinal::pEx2, 0)
          .with(MagicLongitudinal.PEX3, MagicLongitudinal::pEx3, 0)
          .with(MagicLongitudinal.PEX4, MagicLongitudinal::pEx4, 0)
          .with(MagicLongitudinal.PKX1, MagicLongitudinal::pKx1)
          .with(MagicLongitudinal.PKX2, MagicLongitudinal::pKx2, 0)
          .with(MagicLongitudinal.PKX3, MagicLongitudinal::pKx3, 0)
          .with(MagicLongitudinal.PHX1, MagicLongitudinal::pHx1, 0)
          .with(MagicLongitudinal.PHX2, MagicLongitudinal::pHx2, 0)
          .with(MagicLongitudinal.PVX1, MagicLongitudinal::pVx1, 0)
          .with(MagicLongitudinal.PVX2, MagicLongitudinal::pVx2, 0);

  private static final Fields<MagicLateral> LATERAL =
      Fields.<MagicLateral>none()
          .with(MagicLateral.PCY1, MagicLateral::pCy1)
          .with(MagicLateral.PDY1, MagicLateral::pDy1)
          .with(MagicLateral.PDY2, MagicLateral::pDy2)
          .with(MagicLateral.PEY1, MagicLateral::pEy1)
          .with(MagicLateral.PEY2, MagicLateral::pEy2, 0)
          .with(MagicLateral.PEY3, MagicLateral::pEy3, 0)
          .with(MagicLateral.PKY1, MagicLateral::pKy1)
          .with(MagicLateral.PKY2, MagicLateral::pKy2)
          .with(MagicLateral.PKY4, MagicLateral::pKy4, USUAL_PKY4)
          .with(MagicLateral.PHY1, MagicLateral::pHy1, 0)
          .with(MagicLateral.PHY2, MagicLateral::pHy2, 0)
          .with(MagicLateral.PVY1, MagicLateral::pVy1, 0)
          .with(MagicLateral.PVY2, MagicLateral::pVy2, 0);

  private static final Fields<MagicLongitudinalWeight> LONGITUDINAL_WEIGHT =
      Fields.<MagicLongitudinalWeight>none()
          .with(MagicLongitudinalWeight.RBX1, MagicLongitudinalWeight::rBx1)
          .with(MagicLongitudinalWeight.RBX2, MagicLongitudinalWeight::rBx2)
          .with(MagicLongitudinalWeight.RCX1, MagicLongitudinalWeight::rCx1)
          .with(MagicLongitudinalWeight.REX1, MagicLongitudinalWeight::rEx1, 0)
          .with(MagicLongitudinalWeight.REX2, MagicLongitudinalWeight::rEx2, 0)
          .with(MagicLongitudinalWeight.RHX1, MagicLongitudinalWeight::rHx1, 0);

  private static final Fields<MagicLateralWeight> LATERAL_WEIGHT =
      Fields.<MagicLateralWeight>none()
          .with(MagicLateralWeight.RBY1, MagicLateralWeight::rBy1)
          .with(MagicLateralWeight.RBY2, MagicLateralWeight::rBy2)
          .with(MagicLateralWeight.RBY3, MagicLateralWeight::rBy3, 0)
          .with(MagicLateralWeight.RCY1, MagicLateralWeight::rCy1)
          .with(MagicLateralWeight.REY1, MagicLateralWeight::rEy1, 0)
          .with(MagicLateralWeight.REY2, MagicLateralWeight::rEy2, 0)
          .with(MagicLateralWeight.RHY1, MagicLateralWeight::rHy1, 0)
          .with(MagicLateralWeight.RHY2, MagicLateralWeight::rHy2, 0)
          .with(MagicLateralWeight.RVY1, MagicLateralWeight::rVy1, 0)
          .with(MagicLateralWeight.RVY2, MagicLateralWeight::rVy2, 0)
          .with(MagicLateralWeight.RVY4, MagicLateralWeight::rVy4, 0)
          .with(MagicLateralWeight.RVY5, MagicLateralWeight::rVy5, 0)
          .with(MagicLateralWeight.RVY6, MagicLateralWeight::rVy6, 0);

  private MagicFormulaFile() {}

  /** Returns the keys of a tyre and some more. */
  static Set<String> keysAnd(String... more) {
    Set<String> keys = FIELDS.keysAnd(more);
    keys.addAll(
        List.of(LONGITUDINAL_KEY, LATERAL_KEY, LONGITUDINAL_WEIGHT_KEY, LATERAL_WEIGHT_KEY));
    return keys;
  }

  /** Reads the tyre. */
  static MagicFormulaTyre read(YamlMap map) {
    double nominalLoad = FIELDS.read(map).of(MagicFormulaTyre.NOMINAL_LOAD);
    MagicLongitudinal longitudinal = longitudinal(map.get(LONGITUDINAL_KEY));
    MagicLateral lateral = lateral(map.get(LATERAL_KEY));
    MagicLongitudinalWeight longitudinalWeight =
        longitudinalWeight(map.get(LONGITUDINAL_WEIGHT_KEY));
    MagicLateralWeight lateralWeight = lateralWeight(map.get(LATERAL_WEIGHT_KEY));
    return new MagicFormulaTyre(
            nominalLoad, longitudinal, lateral, longitudinalWeight, lateralWeight)
        .centred();
  }

  /** Returns the tyre as the keys and values of a file. */
  static Map<String, Object> write(MagicFormulaTyre tyre) {
    Map<String, Object> out = new LinkedHashMap<>(FIELDS.write(tyre));
    out.put(LONGITUDINAL_KEY, LONGITUDINAL.write(tyre.longitudinal()));
    out.put(LATERAL_KEY, LATERAL.write(tyre.lateral()));
    out.put(LONGITUDINAL_WEIGHT_KEY, LONGITUDINAL_WEIGHT.write(tyre.longitudinalWeight()));
    out.put(LATERAL_WEIGHT_KEY, LATERAL_WEIGHT.write(tyre.lateralWeight()));
    return out;
  }

  private static MagicLongitudinal longitudinal(YamlNode node) {
    Fields.Numbers n = LONGITUDINAL.read(node);
    return node.place(
        () ->
            new MagicLongitudinal(
                n.of(MagicLongitudinal.PCX1),
                n.of(MagicLongitudinal.PDX1),
                n.of(MagicLongitudinal.PDX2),
                n.of(MagicLongitudinal.PEX1),
                n.of(MagicLongitudinal.PEX2),
                n.of(MagicLongitudinal.PEX3),
                n.of(MagicLongitudinal.PEX4),
                n.of(MagicLongitudinal.PKX1),
                n.of(MagicLongitudinal.PKX2),
                n.of(MagicLongitudinal.PKX3),
                n.of(MagicLongitudinal.PHX1),
                n.of(MagicLongitudinal.PHX2),
                n.of(MagicLongitudinal.PVX1),
                n.of(MagicLongitudinal.PVX2)));
  }

  private static MagicLateral lateral(YamlNode node) {
    Fields.Numbers n = LATERAL.read(node);
    return node.place(
        () ->
            new MagicLateral(
                n.of(MagicLateral.PCY1),
                n.of(MagicLateral.PDY1),
                n.of(MagicLateral.PDY2),
                n.of(MagicLateral.PEY1),
                n.of(MagicLateral.PEY2),
                n.of(MagicLateral.PEY3),
                n.of(MagicLateral.PKY1),
                n.of(MagicLateral.PKY2),
                n.of(MagicLateral.PKY4),
                n.of(MagicLateral.PHY1),
                n.of(MagicLateral.PHY2),
                n.of(MagicLateral.PVY1),
                n.of(MagicLateral.PVY2)));
  }

  private static MagicLongitudinalWeight longitudinalWeight(YamlNode node) {
    Fields.Numbers n = LONGITUDINAL_WEIGHT.read(node);
    return node.place(
        () ->
            new MagicLongitudinalWeight(
                n.of(MagicLongitudinalWeight.RBX1),
                n.of(MagicLongitudinalWeight.RBX2),
                n.of(MagicLongitudinalWeight.RCX1),
                n.of(MagicLongitudinalWeight.REX1),
                n.of(MagicLongitudinalWeight.REX2),
                n.of(MagicLongitudinalWeight.RHX1)));
  }

  private static MagicLateralWeight lateralWeight(YamlNode node) {
    Fields.Numbers n = LATERAL_WEIGHT.read(node);
    return node.place(
        () ->
            new MagicLateralWeight(
                n.of(MagicLateralWeight.RBY1),
                n.of(MagicLateralWeight.RBY2),
                n.of(MagicLateralWeight.RBY3),
                n.of(MagicLateralWeight.RCY1),
                n.of(MagicLateralWeight.REY1),
                n.of(MagicLateralWeight.REY2),
                n.of(MagicLateralWeight.RHY1),
                n.of(MagicLateralWeight.RHY2),
                n.of(MagicLateralWeight.RVY1),
                n.of(MagicLateralWeight.RVY2),
                n.of(MagicLateralWeight.RVY4),
                n.of(MagicLateralWeight.RVY5),
                n.of(MagicLateralWeight.RVY6)));
  }
}
