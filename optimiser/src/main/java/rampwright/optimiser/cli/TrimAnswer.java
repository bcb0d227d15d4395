package rampwright.optimiser.cli;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.trim.DifferentialState;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.TrimLimit;
import rampwright.vehicle.trim.WheelState;

/**
 * A trim as a document and as text.
 *
 * @param trim the trim
 * @param reason why a limit lies there; empty when it is none
 */
record TrimAnswer(Trim trim, Optional<TrimLimit> reason) {
  Map<String, Object> document(Event event, NamedSetting setting) {
    JsonMap wanted = new JsonMap();
    wanted.put("speedMps", trim.speed());
    wanted.put("curvature1pm", trim.curvature());
    wanted.put("curvatureGradient1pm2", trim.curvatureGradient());
    wanted.put("sideslipRad", trim.sideslip());
    wanted.put("steerRad", trim.steer());
    wanted.put("axMps2", trim.ax());
    wanted.put("ayMps2", trim.ay());
    wanted.put("cageTorqueNm", trim.cageTorque());
    wanted.put("brakeTorqueNm", trim.brakeTorque());
    DifferentialState unit = Position.ofKit(event).state(trim);
    wanted.put("torqueDifferenceNm", unit.torqueDifference());
    wanted.put("outputSpeedDifferenceRadps", unit.speedDifference());
    wanted.put("yawMomentDifferentialNm", trim.yawMomentDifferential());
    wanted.put("sigmaPerS", trim.sigma());
    wanted.put("limit", reason.map(TrimAnswer::word).orElse(null));
    JsonMap units = new JsonMap();
    Position.driven(event).forEach(p -> units.put(p.label(), document(p.state(trim))));
    wanted.put("differentials", units);
    wanted.put("wheels", trim.wheels().stream().map(TrimAnswer::document).toList());
    return new JsonMap()
        .put("event", event.name())
        .put("setting", setting.name())
        .put("trim", wanted)
        .map();
  }

  private static Map<String, Object> document(DifferentialState unit) {
    return new JsonMap()
        .put("cageTorqueNm", unit.cageTorque())
        .put("torqueDifferenceNm", unit.torqueDifference())
        .put("outputSpeedDifferenceRadps", unit.speedDifference())
        .put("frictionCapacityNm", unit.capacity())
        .put("sticking", unit.sticking())
        .map();
  }

  private static Map<String, Object> document(WheelState wheel) {
    return new JsonMap()
        .put("name", wheel.wheel().shortName())
        .put("fxN", wheel.fx())
        .put("fyN", wheel.fy())
        .put("fzN", wheel.fz())
        .put("slip", wheel.slip())
        .put("slipAngleRad", wheel.slipAngle())
        .put("speedRadps", wheel.speed())
        .map();
  }

  String text(Event event, NamedSetting setting) {
    StringBuilder out = new StringBuilder();
    out.append(event.car().name()).append(", ").append(setting.name());
    reason.ifPresent(why -> out.append(", limited by ").append(words(why)));
    out.append("\n\n").append(car()).append('\n');
    out.append(units(Position.driven(event))).append('\n').append(wheels());
    return out.toString();
  }

  private TextTable car() {
    double sigma = trim.sigma();
    String growth = sigma > 0 ? "doubles in " + Shown.number(Math.log(2) / sigma, 2) + " s" : "";
    return new TextTable()
        .row("speed", Shown.number(trim.speed(), 2), "m/s")
        .row("path curvature", Shown.number(trim.curvature(), 5), "1/m")
        .row("longitudinal acceleration", Shown.number(trim.ax(), 3), "m/s²")
        .row("lateral acceleration", Shown.number(trim.ay(), 3), "m/s²")
        .row("sideslip angle", Shown.degrees(trim.sideslip()), "deg")
        .row("road-wheel steer angle", Shown.degrees(trim.steer()), "deg")
        .row("total brake torque", Shown.number(trim.brakeTorque(), 0), "N·m")
        .row("differential yaw moment", Shown.number(trim.yawMomentDifferential(), 0), "N·m")
        .row("slide growth rate", Shown.number(sigma, 3), "1/s", growth);
  }

  private TextTable units(List<Position> driven) {
    TextTable table = new TextTable();
    table.row("differential", "cage N·m", "difference N·m", "capacity N·m", "speeds rad/s", "");
    for (Position position : driven) {
      DifferentialState unit = position.state(trim);
      table.row(
          position.label(),
          Shown.number(unit.cageTorque(), 1),
          Shown.number(unit.torqueDifference(), 1),
          Shown.number(unit.capacity(), 1),
          Shown.number(unit.speedDifference(), 3),
          unit.sticking() ? "together" : "sliding");
    }
    return table;
  }

  private TextTable wheels() {
    TextTable table = new TextTable();
    table.row("wheel", "Fx N", "Fy N", "Fz N", "slip", "slip angle deg", "speed rad/s");
    for (WheelState wheel : trim.wheels()) {
      table.row(
          wheel.wheel().shortName(),
          Shown.number(wheel.fx(), 0),
          Shown.number(wheel.fy(), 0),
          Shown.number(wheel.fz(), 0),
          Shown.number(wheel.slip(), 4),
          Shown.degrees(wheel.slipAngle()),
          Shown.number(wheel.speed(), 2));
    }
    return table;
  }

  private static String word(TrimLimit reason) {
    return reason.name().toLowerCase(Locale.ROOT);
  }

  private static String words(TrimLimit reason) {
    return switch (reason) {
      case TORQUE -> "engine or brakes";
      case TYRES -> "the tyres";
      case DRIVER -> "the growth of a slide";
    };
  }
}
