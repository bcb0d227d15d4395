package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.tyre.MagicFormulaTyre;
import rampwright.vehicle.tyre.PeakAtLoad;
import rampwright.vehicle.tyre.PeakSlipTyre;
import rampwright.vehicle.tyre.SlipCurve;
import rampwright.vehicle.tyre.Tyre;

/** Tyres as YAML. {@code model} says which kind: {@code peak_slip} or {@code magic_formula}. */
public final class TyreFile {
  private static final String MODEL = "model";
  private static final String NAME = "name";
  private static final String PEAK_SLIP = "peak_slip";
  private static final String MAGIC_FORMULA = "magic_formula";

  private static final Fields<PeakAtLoad> PEAK =
      Fields.<PeakAtLoad>none()
          .with(PeakAtLoad.LOAD, PeakAtLoad::load)
          .with(PeakAtLoad.FRICTION_X, PeakAtLoad::frictionX)
          .with(PeakAtLoad.FRICTION_Y, PeakAtLoad::frictionY)
          .with(PeakAtLoad.SLIP, PeakAtLoad::slip)
          .with(PeakAtLoad.SLIP_ANGLE, PeakAtLoad::slipAngle);

  private TyreFile() {}

  /**
   * Reads a tyre file.
   *
   * @throws InvalidInput when it breaks a rule
   */
  public static Tyre read(FileSource source, String path) {
    return read(YamlReader.read(source, path));
  }

  static Tyre read(YamlNode node) {
    String model =
        node.peek(MODEL).choice(Map.of(PEAK_SLIP, PEAK_SLIP, MAGIC_FORMULA, MAGIC_FORMULA));
    return model.equals(PEAK_SLIP) ? peakSlip(node) : magicFormula(node);
  }

  private static MagicFormulaTyre magicFormula(YamlNode node) {
    YamlMap map = node.map(MagicFormulaFile.keysAnd(NAME, MODEL));
    map.find(NAME).ifPresent(YamlNode::text);
    return MagicFormulaFile.read(map);
  }

  private static PeakSlipTyre peakSlip(YamlNode node) {
    YamlMap map = node.map(List.of(NAME, MODEL, "light", "heavy", "longitudinal", "lateral"));
    map.find(NAME).ifPresent(YamlNode::text);
    PeakAtLoad light = peak(map.get("light"));
    PeakAtLoad heavy = peak(map.get("heavy"));
    SlipCurve longitudinal = curve(map.get("longitudinal"));
    SlipCurve lateral = curve(map.get("lateral"));
    return map.get("heavy").place(() -> new PeakSlipTyre(light, heavy, longitudinal, lateral));
  }

  /**
   * Returns a tyre as the keys and values of a file.
   *
   * @throws IllegalArgumentException for a kind of tyre that has no file form
   */
  static Map<String, Object> write(Tyre tyre) {
    Map<String, Object> out = new LinkedHashMap<>();
    if (tyre instanceof MagicFormulaTyre magic) {
      out.put(MODEL, MAGIC_FORMULA);
      out.putAll(MagicFormulaFile.write(magic));
      return out;
    }
    if (!(tyre instanceof PeakSlipTyre peakSlip)) {
      throw new IllegalArgumentException("no file form for " + tyre.getClass());
    }
    out.put(MODEL, PEAK_SLIP);
    out.put("light", PEAK.write(peakSlip.light()));
    out.put("heavy", PEAK.write(peakSlip.heavy()));
    out.put("longitudinal", write(peakSlip.longitudinal()));
    out.put("lateral", write(peakSlip.lateral()));
    return out;
  }

  private static PeakAtLoad peak(YamlNode node) {
    Fields.Numbers n = PEAK.read(node);
    return node.place(
        () ->
            new PeakAtLoad(
                n.of(PeakAtLoad.LOAD),
                n.of(PeakAtLoad.FRICTION_X),
                n.of(PeakAtLoad.FRICTION_Y),
                n.of(PeakAtLoad.SLIP),
                n.of(PeakAtLoad.SLIP_ANGLE)));
  }

  /** Without a scale the peak lies at the entered slip. */
  private static SlipCurve curve(YamlNode node) {
    YamlMap map = node.map(List.of(SlipCurve.SHAPE.key(), SlipCurve.SCALE.key()));
    double shape = map.number(SlipCurve.SHAPE);
    SlipCurve curve = map.place(() -> SlipCurve.peakAtOne(shape));
    double scale = map.number(SlipCurve.SCALE, curve.scale());
    return map.place(() -> new SlipCurve(shape, scale));
  }

  private static Map<String, Object> write(SlipCurve curve) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(SlipCurve.SHAPE.key(), Fields.shown(SlipCurve.SHAPE, curve.shape()));
    if (!curve.equals(SlipCurve.peakAtOne(curve.shape()))) {
      out.put(SlipCurve.SCALE.key(), Fields.shown(SlipCurve.SCALE, curve.scale()));
    }
    return out;
  }
}
