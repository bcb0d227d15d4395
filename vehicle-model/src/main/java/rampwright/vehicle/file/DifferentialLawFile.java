package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import rampwright.vehicle.differential.BrakeLock;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateFriction;
import rampwright.vehicle.differential.PreloadPath;
import rampwright.vehicle.differential.RefinedPlateDifferential;
import rampwright.vehicle.differential.SiliconeOil;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.differential.TorqueSensingDifferential;
import rampwright.vehicle.differential.ViscousDifferential;
import rampwright.vehicle.differential.ViscousPlates;
import rampwright.vehicle.differential.WormGear;

/**
 * One law as YAML: {@code kind} and its numbers. A viscous unit may be given by its plates and oil
 * and a torque-sensing one by its worm gear; both are written back as the laws that follow.
 */
final class DifferentialLawFile {
  private enum Kind {
    OPEN,
    SPOOL,
    PLATE,
    VISCOUS,
    VISCOUS_PLATES,
    TORQUE_SENSING,
    WORM_GEAR,
    BRAKE_LOCK
  }

  private static final String KIND = "kind";
  private static final String PRELOAD_PATH = "preload_path";
  private static final String ARRANGEMENT = "arrangement";

  private static final Fields<OpenDifferential> OPEN =
      Fields.<OpenDifferential>none()
          .with(OpenDifferential.FRICTION_SHARE, OpenDifferential::frictionShare, 0);

  private static final Fields<PlateDifferential> PLATE =
      Fields.<PlateDifferential>none()
          .with(PlateDifferential.PRELOAD, PlateDifferential::preload)
          .with(PlateDifferential.DRIVE_SHARE, PlateDifferential::driveShare)
          .with(PlateDifferential.COAST_SHARE, PlateDifferential::coastShare);

  private static final PlateFriction STEADY = PlateFriction.CONSTANT;

  private static final Fields<RefinedPlateDifferential> REFINED =
      Fields.<RefinedPlateDifferential>none()
          .with(
              RefinedPlateDifferential.SIDE_GEAR_SHARE, RefinedPlateDifferential::sideGearShare, 0)
          .with(
              PlateFriction.SLIDING_RATIO, d -> d.friction().slidingRatio(), STEADY.slidingRatio())
          .with(
              PlateFriction.SLIDING_SPEED, d -> d.friction().slidingSpeed(), STEADY.slidingSpeed())
          .with(PlateFriction.TEMPERATURE, d -> d.friction().temperature(), STEADY.temperature())
          .with(
              PlateFriction.REFERENCE_TEMPERATURE,
              d -> d.friction().referenceTemperature(),
              STEADY.referenceTemperature())
          .with(PlateFriction.FADE, d -> d.friction().fade(), STEADY.fade());

  private static final Fields<ViscousDifferential> VISCOUS =
      Fields.<ViscousDifferential>none()
          .with(ViscousDifferential.COEFFICIENT, ViscousDifferential::coefficient)
          .with(ViscousDifferential.THINNING_SPEED, ViscousDifferential::thinningSpeed, 1)
          .with(ViscousDifferential.THINNING_EXPONENT, ViscousDifferential::thinningExponent, 1);

  private static final Fields<ViscousPlates> VISCOUS_PLATES =
      Fields.<ViscousPlates>none()
          .with(ViscousPlates.OUTER_RADIUS, ViscousPlates::outerRadius)
          .with(ViscousPlates.INNER_RADIUS, ViscousPlates::innerRadius)
          .with(ViscousPlates.GAP_WIDTH, ViscousPlates::gapWidth);

  private static final Fields<SiliconeOil> OIL =
      Fields.<SiliconeOil>none()
          .with(SiliconeOil.VISCOSITY, SiliconeOil::viscosity25)
          .with(SiliconeOil.THINNING_RATE, SiliconeOil::thinningRate, 1e6)
          .with(ViscousDifferential.THINNING_EXPONENT, SiliconeOil::thinningExponent, 1);

  private static final Fields<TorqueSensingDifferential> TORQUE_SENSING =
      Fields.<TorqueSensingDifferential>none()
          .with(PlateDifferential.PRELOAD, TorqueSensingDifferential::preload, 0)
          .with(TorqueSensingDifferential.DRIVE_BIAS, TorqueSensingDifferential::driveBias)
          .with(TorqueSensingDifferential.COAST_BIAS, TorqueSensingDifferential::coastBias);

  private static final Fields<WormGear> WORM_GEAR =
      Fields.<WormGear>none()
          .with(WormGear.LEAD_ANGLE, WormGear::leadAngle)
          .with(WormGear.PRESSURE_ANGLE, WormGear::pressureAngle)
          .with(WormGear.FRICTION, WormGear::friction);

  private static final Fields<BrakeLock> BRAKE_LOCK =
      Fields.<BrakeLock>none()
          .with(BrakeLock.THRESHOLD, BrakeLock::threshold)
          .with(BrakeLock.GAIN, BrakeLock::gain)
          .with(BrakeLock.LIMIT, BrakeLock::limit);

  private static final Spool SPOOL = new Spool();

  private DifferentialLawFile() {}

  static Differential read(YamlNode node) {
    if (!node.isMap()) {
      return node.choice(Map.of(name(Kind.OPEN), OpenDifferential.IDEAL, name(Kind.SPOOL), SPOOL));
    }
    return switch (node.peek(KIND).choice(YamlNode.names(Kind.class))) {
      case OPEN -> {
        Fields.Numbers n = OPEN.read(node.map(OPEN.keysAnd(KIND)));
        yield new OpenDifferential(n.of(OpenDifferential.FRICTION_SHARE));
      }
      case SPOOL -> {
        node.map(Set.of(KIND));
        yield SPOOL;
      }
      case PLATE -> plate(node);
      case VISCOUS -> {
        Fields.Numbers n = VISCOUS.read(node.map(VISCOUS.keysAnd(KIND)));
        yield new ViscousDifferential(
            n.of(ViscousDifferential.COEFFICIENT),
            n.of(ViscousDifferential.THINNING_SPEED),
            n.of(ViscousDifferential.THINNING_EXPONENT));
      }
      case VISCOUS_PLATES -> viscousPlates(node);
      case TORQUE_SENSING -> {
        Fields.Numbers n = TORQUE_SENSING.read(node.map(TORQUE_SENSING.keysAnd(KIND)));
        yield new TorqueSensingDifferential(
            n.of(PlateDifferential.PRELOAD),
            n.of(TorqueSensingDifferential.DRIVE_BIAS),
            n.of(TorqueSensingDifferential.COAST_BIAS));
      }
      case WORM_GEAR -> wormGear(node);
      case BRAKE_LOCK -> {
        Fields.Numbers n = BRAKE_LOCK.read(node.map(BRAKE_LOCK.keysAnd(KIND)));
        yield new BrakeLock(n.of(BrakeLock.THRESHOLD), n.of(BrakeLock.GAIN), n.of(BrakeLock.LIMIT));
      }
    };
  }

  private static Differential plate(YamlNode node) {
    Set<String> keys = PLATE.keysAnd(KIND, PRELOAD_PATH);
    keys.addAll(REFINED.keysAnd());
    YamlMap map = node.map(keys);
    Fields.Numbers n = PLATE.read(map);
    PlateDifferential plain =
        new PlateDifferential(
            n.of(PlateDifferential.PRELOAD),
            n.of(PlateDifferential.DRIVE_SHARE),
            n.of(PlateDifferential.COAST_SHARE));
    PreloadPath path =
        map.find(PRELOAD_PATH)
            .map(value -> value.choice(YamlNode.names(PreloadPath.class)))
            .orElse(PreloadPath.PARALLEL);
    Fields.Numbers more = REFINED.read(map);
    RefinedPlateDifferential refined =
        new RefinedPlateDifferential(
            plain,
            more.of(RefinedPlateDifferential.SIDE_GEAR_SHARE),
            path,
            new PlateFriction(
                more.of(PlateFriction.SLIDING_RATIO),
                more.of(PlateFriction.SLIDING_SPEED),
                more.of(PlateFriction.TEMPERATURE),
                more.of(PlateFriction.REFERENCE_TEMPERATURE),
                more.of(PlateFriction.FADE)));
    return refined.refines() ? refined : plain;
  }

  private static Differential viscousPlates(YamlNode node) {
    String gaps = ViscousPlates.GAPS.key();
    String temperature = SiliconeOil.TEMPERATURE.key();
    Set<String> keys = VISCOUS_PLATES.keysAnd(KIND, ARRANGEMENT, gaps, temperature);
    keys.addAll(OIL.keysAnd());
    YamlMap map = node.map(keys);
    Fields.Numbers n = VISCOUS_PLATES.read(map);
    Fields.Numbers o = OIL.read(map);
    int count = map.get(gaps).wholeNumber(ViscousPlates.GAPS);
    ViscousPlates.Arrangement arrangement =
        map.get(ARRANGEMENT).choice(YamlNode.names(ViscousPlates.Arrangement.class));
    SiliconeOil oil =
        new SiliconeOil(
            o.of(SiliconeOil.VISCOSITY),
            o.of(SiliconeOil.THINNING_RATE),
            o.of(ViscousDifferential.THINNING_EXPONENT));
    double degrees = map.number(SiliconeOil.TEMPERATURE);
    return map.place(
        () ->
            new ViscousPlates(
                    n.of(ViscousPlates.OUTER_RADIUS),
                    n.of(ViscousPlates.INNER_RADIUS),
                    n.of(ViscousPlates.GAP_WIDTH),
                    count,
                    arrangement)
                .law(oil, degrees));
  }

  private static Differential wormGear(YamlNode node) {
    Set<String> keys = WORM_GEAR.keysAnd(KIND, PlateDifferential.PRELOAD.key());
    YamlMap map = node.map(keys);
    Fields.Numbers n = WORM_GEAR.read(map);
    WormGear gear =
        new WormGear(
            n.of(WormGear.LEAD_ANGLE), n.of(WormGear.PRESSURE_ANGLE), n.of(WormGear.FRICTION));
    double preload = map.number(PlateDifferential.PRELOAD, 0);
    return map.place(() -> gear.law(preload));
  }

  static Map<String, Object> write(Differential law) {
    if (law instanceof OpenDifferential open) {
      return kind(Kind.OPEN, OPEN.write(open));
    }
    if (law instanceof PlateDifferential plate) {
      return kind(Kind.PLATE, PLATE.write(plate));
    }
    if (law instanceof RefinedPlateDifferential refined) {
      Map<String, Object> out = kind(Kind.PLATE, PLATE.write(refined.nominal()));
      out.put(PRELOAD_PATH, refined.preloadPath().name().toLowerCase(Locale.ROOT));
      out.putAll(REFINED.write(refined));
      return out;
    }
    if (law instanceof ViscousDifferential viscous) {
      return kind(Kind.VISCOUS, VISCOUS.write(viscous));
    }
    if (law instanceof TorqueSensingDifferential sensing) {
      return kind(Kind.TORQUE_SENSING, TORQUE_SENSING.write(sensing));
    }
    if (law instanceof BrakeLock lock) {
      return kind(Kind.BRAKE_LOCK, BRAKE_LOCK.write(lock));
    }
    return kind(Kind.SPOOL, Map.of());
  }

  private static Map<String, Object> kind(Kind kind, Map<String, Object> numbers) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(KIND, name(kind));
    out.putAll(numbers);
    return out;
  }

  private static String name(Kind kind) {
    return kind.name().toLowerCase(Locale.ROOT);
  }
}
