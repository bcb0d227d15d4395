package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;

/**
 * Laws of differentials as YAML: the word {@code open} or {@code spool}, or a group with {@code
 * kind} ({@code open}, {@code spool}, {@code plate}, {@code viscous}, {@code viscous_plates},
 * {@code torque_sensing}, {@code worm_gear}, {@code brake_lock}) and the law's numbers. A car's set
 * has one law for each position that its layout drives.
 */
public final class DifferentialFile {
  private static final String FRONT = "front";
  private static final String CENTRE = "centre";
  private static final String REAR = "rear";

  private DifferentialFile() {}

  /**
   * Reads the differentials of a car by position.
   *
   * @param node one key per driven position: {@code front}, {@code centre}, {@code rear}
   * @param layout the car's layout
   * @throws InvalidInput when a law breaks a rule or the layout has no such position
   */
  public static DifferentialSet readSet(YamlNode node, DriveLayout layout) {
    YamlMap map = node.map(positions(layout));
    return new DifferentialSet(position(map, FRONT), position(map, CENTRE), position(map, REAR));
  }

  /** Returns a car's differentials as the keys and values of a file. */
  public static Map<String, Object> writeSet(DifferentialSet set, DriveLayout layout) {
    Map<String, Differential> all = new LinkedHashMap<>();
    all.put(FRONT, set.front());
    all.put(CENTRE, set.centre());
    all.put(REAR, set.rear());
    Map<String, Object> out = new LinkedHashMap<>();
    positions(layout)
        .forEach(position -> out.put(position, DifferentialLawFile.write(all.get(position))));
    return out;
  }

  private static List<String> positions(DriveLayout layout) {
    return switch (layout) {
      case REAR -> List.of(REAR);
      case FRONT -> List.of(FRONT);
      case ALL -> List.of(FRONT, CENTRE, REAR);
    };
  }

  private static Differential position(YamlMap map, String position) {
    return map.find(position).map(DifferentialLawFile::read).orElse(OpenDifferential.IDEAL);
  }
}
