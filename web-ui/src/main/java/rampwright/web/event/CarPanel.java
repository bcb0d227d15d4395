package rampwright.web.event;

import java.util.Locale;
import java.util.stream.Collectors;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.driveline.Driveline;
import rampwright.web.widget.Facts;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;

/** The car in the figures that matter for its differential. */
final class CarPanel extends Section {
  private static final long serialVersionUID = 1L;

  CarPanel(Car car, Conditions conditions) {
    super("Car: " + car.name());
    Chassis chassis = car.chassis();
    Driveline driveline = car.driveline();
    add(
        new Facts()
            .with("Driven axle", driveline.layout().name().toLowerCase(Locale.ROOT))
            .with("Mass with driver", Shown.of(Chassis.MASS, chassis.mass()))
            .with("Mass with fuel", Shown.of(Chassis.MASS, chassis.mass() + conditions.fuelMass()))
            .with("Weight on front axle", Shown.of(frontShare(chassis) * 100, 1, "%"))
            .with("Wheelbase", Shown.of(Chassis.WHEELBASE, chassis.wheelbase()))
            .with("Track front", Shown.of(Chassis.TRACK_FRONT, chassis.trackFront()))
            .with("Track rear", Shown.of(Chassis.TRACK_REAR, chassis.trackRear()))
            .with("Centre of gravity height", Shown.of(Chassis.CG_HEIGHT, chassis.cgHeight()))
            .with("Front share of roll stiffness", Shown.of(chassis.frontRollShare() * 100, 1, "%"))
            .with("Final drive ratio", Shown.bare(driveline.finalDrive(), 2))
            .with("Gear ratios", ratios(driveline))
            .with("Rev limit", Shown.of(driveline.engine().revLimit() * 30 / Math.PI, 0, "1/min"))
            .with("Rear rolling radius", Shown.of(Car.REAR_RADIUS, car.rearRadius()))
            .with("Brake torque at front", Shown.of(car.brakes().frontShare() * 100, 1, "%")));
  }

  private static double frontShare(Chassis chassis) {
    return chassis.cgToRearAxle() / chassis.wheelbase();
  }

  private static String ratios(Driveline driveline) {
    return driveline.gearRatios().stream()
        .map(ratio -> Shown.bare(ratio, 2))
        .collect(Collectors.joining(" · "));
  }
}
