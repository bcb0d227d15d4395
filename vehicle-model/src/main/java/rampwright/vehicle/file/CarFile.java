package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.vehicle.Car;
import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.tyre.Tyre;

/**
 * Cars as YAML: {@code name} and the groups {@code chassis}, {@code aero}, {@code brakes}, {@code
 * driveline} and {@code tyres}. A tyre is the path of a tyre file, relative to the car's file, or
 * the tyre's own keys.
 */
public final class CarFile {
  private static final String NAME = "name";
  private static final String CHASSIS = "chassis";
  private static final String AERO = "aero";
  private static final String BRAKES = "brakes";
  private static final String DRIVELINE = "driveline";
  private static final String TYRES = "tyres";
  private static final String FRONT = "front";
  private static final String REAR = "rear";

  private static final Fields<Car> CAR_FIELDS =
      Fields.<Car>none()
          .with(Car.FRONT_RADIUS, Car::frontRadius)
          .with(Car.REAR_RADIUS, Car::rearRadius);

  private static final Fields<Chassis> CHASSIS_FIELDS =
      Fields.<Chassis>none()
          .with(Chassis.MASS, Chassis::mass)
          .with(Chassis.YAW_INERTIA, Chassis::yawInertia)
          .with(Chassis.WHEELBASE, Chassis::wheelbase)
          .with(Chassis.CG_TO_FRONT_AXLE, Chassis::cgToFrontAxle)
          .with(Chassis.CG_HEIGHT, Chassis::cgHeight)
          .with(Chassis.TRACK_FRONT, Chassis::trackFront)
          .with(Chassis.TRACK_REAR, Chassis::trackRear)
          .with(Chassis.ROLL_CENTRE_FRONT, Chassis::rollCentreFront)
          .with(Chassis.ROLL_CENTRE_REAR, Chassis::rollCentreRear)
          .with(Chassis.FRONT_ROLL_SHARE, Chassis::frontRollShare);

  private static final Fields<Aero> AERO_FIELDS =
      Fields.<Aero>none()
          .with(Aero.DRAG_AREA, Aero::dragArea)
          .with(Aero.DOWNFORCE_FRONT, Aero::downforceAreaFront)
          .with(Aero.DOWNFORCE_REAR, Aero::downforceAreaRear);

  private static final Fields<Brakes> BRAKE_FIELDS =
      Fields.<Brakes>none()
          .with(Brakes.FRONT_SHARE, Brakes::frontShare)
          .with(Brakes.MAX_TORQUE, Brakes::maxTorque);

  private CarFile() {}

  /**
   * Reads a car file and the tyre files that it names.
   *
   * @throws InvalidInput when one of them breaks a rule
   */
  public static Car read(FileSource source, String path) {
    return read(source, path, YamlReader.read(source, path));
  }

  /**
   * Reads a car from a node of a larger file.
   *
   * @param source where tyre files are
   * @param path the file that the node stands in
   * @param node the car's keys
   * @throws InvalidInput when the car or one of its tyres breaks a rule
   */
  public static Car read(FileSource source, String path, YamlNode node) {
    YamlMap map = node.map(List.of(NAME, CHASSIS, AERO, BRAKES, DRIVELINE, TYRES));
    String name = map.get(NAME).text();
    Chassis chassis = chassis(map.get(CHASSIS));
    Aero aero = aero(map.get(AERO));
    Brakes brakes = brakes(map.get(BRAKES));
    Driveline driveline = DrivelineFile.read(map.get(DRIVELINE));
    YamlMap tyres = map.get(TYRES).map(CAR_FIELDS.keysAnd(FRONT, REAR));
    Tyre front = tyre(source, path, tyres.get(FRONT));
    Tyre rear = tyre(source, path, tyres.get(REAR));
    Fields.Numbers n = CAR_FIELDS.read(tyres);
    return map.place(
        () ->
            new Car(
                name,
                chassis,
                aero,
                brakes,
                driveline,
                front,
                rear,
                n.of(Car.FRONT_RADIUS),
                n.of(Car.REAR_RADIUS)));
  }

  /** Returns a car as the text of a file, tyres included. */
  public static String write(Car car) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(NAME, car.name());
    out.put(CHASSIS, CHASSIS_FIELDS.write(car.chassis()));
    out.put(AERO, AERO_FIELDS.write(car.aero()));
    out.put(BRAKES, BRAKE_FIELDS.write(car.brakes()));
    out.put(DRIVELINE, DrivelineFile.write(car.driveline()));
    Map<String, Object> tyres = new LinkedHashMap<>(CAR_FIELDS.write(car));
    tyres.put(FRONT, TyreFile.write(car.frontTyre()));
    tyres.put(REAR, TyreFile.write(car.rearTyre()));
    out.put(TYRES, tyres);
    return YamlText.write(out);
  }

  private static Tyre tyre(FileSource source, String path, YamlNode node) {
    if (node.isMap()) {
      return TyreFile.read(node);
    }
    String file = FileSource.resolve(path, node.text());
    return node.place(() -> TyreFile.read(source, file));
  }

  private static Chassis chassis(YamlNode node) {
    Fields.Numbers n = CHASSIS_FIELDS.read(node);
    return node.place(
        () ->
            new Chassis(
                n.of(Chassis.MASS),
                n.of(Chassis.YAW_INERTIA),
                n.of(Chassis.WHEELBASE),
                n.of(Chassis.CG_TO_FRONT_AXLE),
                n.of(Chassis.CG_HEIGHT),
                n.of(Chassis.TRACK_FRONT),
                n.of(Chassis.TRACK_REAR),
                n.of(Chassis.ROLL_CENTRE_FRONT),
                n.of(Chassis.ROLL_CENTRE_REAR),
                n.of(Chassis.FRONT_ROLL_SHARE)));
  }

  private static Aero aero(YamlNode node) {
    Fields.Numbers n = AERO_FIELDS.read(node);
    return new Aero(n.of(Aero.DRAG_AREA), n.of(Aero.DOWNFORCE_FRONT), n.of(Aero.DOWNFORCE_REAR));
  }

  private static Brakes brakes(YamlNode node) {
    Fields.Numbers n = BRAKE_FIELDS.read(node);
    return new Brakes(n.of(Brakes.FRONT_SHARE), n.of(Brakes.MAX_TORQUE));
  }
}
