package rampwright.optimiser.cli;

import java.util.List;
import java.util.Locale;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.trim.DifferentialState;
import rampwright.vehicle.trim.Trim;

/** Where a differential sits. */
enum Position {
  FRONT,
  CENTRE,
  REAR;

  /** Returns the positions that the event's car drives. */
  static List<Position> driven(Event event) {
    return switch (event.car().driveline().layout()) {
      case FRONT -> List.of(FRONT);
      case REAR -> List.of(REAR);
      case ALL -> List.of(values());
    };
  }

  /** Returns the position of the kit's unit. */
  static Position ofKit(Event event) {
    return event.car().driveline().layout() == DriveLayout.FRONT ? FRONT : REAR;
  }

  String label() {
    return name().toLowerCase(Locale.ROOT);
  }

  Differential of(DifferentialSet set) {
    return switch (this) {
      case FRONT -> set.front();
      case CENTRE -> set.centre();
      case REAR -> set.rear();
    };
  }

  DifferentialState state(Trim trim) {
    return this == CENTRE ? trim.centre() : trim.axles().get(this == FRONT ? 0 : 1);
  }
}
