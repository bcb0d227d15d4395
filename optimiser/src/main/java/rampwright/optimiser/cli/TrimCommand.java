package rampwright.optimiser.cli;

import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;

/** {@code rampwright trim}: the car at one point of a flat road. */
@Command(
    name = "trim",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    customSynopsis = {
      "rampwright trim EVENT.yaml --setting NAME --speed-mps V --curvature-1pm K",
      "                [--curvature-gradient-1pm2 G]",
      "                (--cage-torque-nm T | --limit drive|brake|corner [--sigma-max S]) [--json]"
    },
    description = {
      "Shows the steady state of the car at one point of a flat road.",
      "With a cage torque the brakes are off. A limit is the largest acceleration, the strongest"
          + " braking, or the largest constant speed."
    })
final class TrimCommand implements Callable<Integer> {
  private static final Quantity TORQUE =
      Quantity.si("cage_torque_nm", "cage torque", "N·m", -1e5, 1e5, "");
  private static final Quantity GROWTH =
      Quantity.si("sigma_max", "largest slide growth rate", "1/s", -20, 50, "");

  /** What can be asked for at a limit. */
  enum Limit {
    DRIVE,
    BRAKE,
    CORNER;

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  @Mixin private EventArgument event;
  @Mixin private OutputOption output;

  @Option(
      names = "--setting",
      paramLabel = "NAME",
      required = true,
      description = "Name of one of the event's settings.")
  private String setting;

  @Option(names = "--speed-mps", paramLabel = "V", description = "Speed (m/s).")
  private Double speed;

  @Option(
      names = "--curvature-1pm",
      paramLabel = "K",
      required = true,
      description = "Path curvature (1/m), positive to the left.")
  private double curvature;

  @Option(
      names = "--curvature-gradient-1pm2",
      paramLabel = "G",
      defaultValue = "0",
      description = "Change of curvature along the path (1/m²); 0 where it is not given.")
  private double gradient;

  @Option(
      names = "--cage-torque-nm",
      paramLabel = "T",
      description = "Torque into the differential's case (N·m); negative on overrun.")
  private Double cageTorque;

  @Option(
      names = "--limit",
      paramLabel = "drive|brake|corner",
      description = "The limit to look for; corner finds the speed itself.")
  private Limit limit;

  @Option(
      names = "--sigma-max",
      paramLabel = "S",
      description = "Largest slide growth rate (1/s) the driver masters; without: the car's limit.")
  private Double growth;

  @Override
  public Integer call() {
    if ((cageTorque == null) == (limit == null)) {
      String given = limit == null ? "neither" : "both";
      throw InvalidInput.of("question", given, "one of --cage-torque-nm and --limit", "");
    }
    if (growth != null && limit == null) {
      throw InvalidInput.of("option", "--sigma-max", "used together with --limit", "");
    }
    Event read = event.read();
    NamedSetting chosen = read.setting(setting);
    Trims trims = new Trims(read.car(), read.conditions(), chosen.differentials());
    TrimAnswer answer = limit == null ? atTorque(trims) : atLimit(trims);
    output.print(() -> answer.text(read, chosen), () -> answer.document(read, chosen));
    return 0;
  }

  private TrimAnswer atTorque(Trims trims) {
    double torque = TORQUE.check(cageTorque);
    Optional<Trim> trim = trims.atCageTorque(givenSpeed(), curvature, gradient, torque);
    return new TrimAnswer(trim.orElseThrow(() -> noTrim(torque)), Optional.empty());
  }

  private TrimAnswer atLimit(Trims trims) {
    double most = growth == null ? Double.POSITIVE_INFINITY : GROWTH.check(growth);
    Optional<Trims.AtLimit> found =
        switch (limit) {
          case DRIVE -> trims.driveLimit(givenSpeed(), curvature, gradient, most);
          case BRAKE -> trims.brakeLimit(givenSpeed(), curvature, gradient, most);
          case CORNER -> trims.cornerLimit(curvature, gradient, most);
        };
    Trims.AtLimit there = found.orElseThrow(this::noLimit);
    return new TrimAnswer(there.trim(), Optional.of(there.reason()));
  }

  private static InvalidInput noTrim(double torque) {
    return InvalidInput.value(
        TORQUE.label(),
        torque,
        TORQUE.unit(),
        "one with which the car can follow this path at this speed",
        "look for the limit first with --limit");
  }

  private InvalidInput noLimit() {
    String rule =
        limit == Limit.CORNER
            ? "large enough to limit the speed"
            : "small enough that the car can follow the path at this speed";
    return InvalidInput.value(Trims.CURVATURE.label(), curvature, Trims.CURVATURE.unit(), rule, "");
  }

  private double givenSpeed() {
    if (speed == null) {
      throw InvalidInput.of("speed", "missing", "given with --speed-mps", "");
    }
    return speed;
  }
}
