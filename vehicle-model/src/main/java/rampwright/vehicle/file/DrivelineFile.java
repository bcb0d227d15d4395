package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.driveline.Engine;
import rampwright.vehicle.driveline.TorqueCurve;

/** Engine and gears as YAML; torque curves are lists of {@code [rpm, N·m]} pairs. */
final class DrivelineFile {
  private static final String ENGINE = "engine";
  private static final String LAYOUT = "layout";
  private static final String FULL_LOAD = "full_load_rpm_nm";
  private static final String OVERRUN = "overrun_rpm_nm";

  /** Half and half, for a car that has no centre differential. */
  private static final double EVEN = 0.5;

  private static final Fields<Driveline> FIELDS =
      Fields.<Driveline>none()
          .with(Driveline.FINAL_DRIVE, Driveline::finalDrive)
          .with(Driveline.EFFICIENCY, Driveline::efficiency)
          .with(Driveline.SHIFT_TIME, Driveline::shiftTime)
          .with(Driveline.FRONT_TORQUE_SHARE, Driveline::frontTorqueShare, EVEN);

  private static final Fields<Engine> ENGINE_FIELDS =
      Fields.<Engine>none().with(Engine.REV_LIMIT, Engine::revLimit);

  private DrivelineFile() {}

  static Driveline read(YamlNode node) {
    YamlMap map = node.map(FIELDS.keysAnd(ENGINE, LAYOUT, Driveline.GEAR_RATIO.key()));
    Engine engine = engine(map.get(ENGINE));
    DriveLayout layout = map.get(LAYOUT).choice(YamlNode.names(DriveLayout.class));
    YamlNode gears = map.get(Driveline.GEAR_RATIO.key());
    List<Double> ratios =
        gears.items().stream().map(item -> item.number(Driveline.GEAR_RATIO)).toList();
    Fields.Numbers n = FIELDS.read(map);
    return gears.place(
        () ->
            new Driveline(
                engine,
                ratios,
                n.of(Driveline.FINAL_DRIVE),
                n.of(Driveline.EFFICIENCY),
                n.of(Driveline.SHIFT_TIME),
                layout,
                n.of(Driveline.FRONT_TORQUE_SHARE)));
  }

  static Map<String, Object> write(Driveline driveline) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(LAYOUT, driveline.layout().name().toLowerCase(Locale.ROOT));
    out.put(
        Driveline.GEAR_RATIO.key(),
        driveline.gearRatios().stream().map(r -> Fields.shown(Driveline.GEAR_RATIO, r)).toList());
    out.putAll(FIELDS.write(driveline));
    Map<String, Object> engine = new LinkedHashMap<>(ENGINE_FIELDS.write(driveline.engine()));
    engine.put(FULL_LOAD, write(driveline.engine().fullLoad()));
    engine.put(OVERRUN, write(driveline.engine().overrun()));
    out.put(ENGINE, engine);
    return out;
  }

  private static Engine engine(YamlNode node) {
    YamlMap map = node.map(ENGINE_FIELDS.keysAnd(FULL_LOAD, OVERRUN));
    TorqueCurve fullLoad = curve(map.get(FULL_LOAD));
    TorqueCurve overrun = curve(map.get(OVERRUN));
    double revLimit = ENGINE_FIELDS.read(map).of(Engine.REV_LIMIT);
    return map.place(() -> new Engine(fullLoad, overrun, revLimit));
  }

  private static TorqueCurve curve(YamlNode node) {
    List<TorqueCurve.Point> points = node.items().stream().map(DrivelineFile::point).toList();
    return node.place(() -> new TorqueCurve(points));
  }

  private static TorqueCurve.Point point(YamlNode node) {
    List<YamlNode> pair = node.items();
    if (pair.size() != 2) {
      throw node.fault(
          "torque point", pair.size() + " values", "a pair of speed and torque", "use [rpm, N·m]");
    }
    double speed = pair.get(0).number(TorqueCurve.Point.SPEED);
    double torque = pair.get(1).number(TorqueCurve.Point.TORQUE);
    return node.place(() -> new TorqueCurve.Point(speed, torque));
  }

  private static List<?> write(TorqueCurve curve) {
    return curve.points().stream()
        .map(
            p ->
                List.of(
                    Fields.shown(TorqueCurve.Point.SPEED, p.speed()),
                    Fields.shown(TorqueCurve.Point.TORQUE, p.torque())))
        .toList();
  }
}
