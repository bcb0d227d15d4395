package rampwright.vehicle.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import rampwright.vehicle.differential.Differential;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.Spool;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.input.InvalidInput;

/**
 * Laws of differentials as YAML: the word {@code open} or {@code spool}, or a group with {@code
 * kind} and the law's numbers. A car's set has one law for each position that its layout drives.
 */
public final class DifferentialFile {
  private static final String KIND = "kind";
  private static final String OPEN = "open";
  private static final String SPOOL = "spool";
  private static final String PLATE = "plate";

  private static final String FRONT = "front";
  private static final String CENTRE = "centre";
  private static final String REAR = "rear";

  private static final Fields<OpenDifferential> OPEN_FIELDS =
      Fields.<OpenDifferential>none()
          .with(OpenDifferential.FRICTION_SHARE, OpenDifferential::frictionShare, 0);

  private static final Fields<PlateDifferential> PLATE_FIELDS =
      Fields.<PlateDifferential>none()
          .with(PlateDifferential.PRELOAD, PlateDifferential::preload)
          .with(PlateDifferential.DRIVE_SHARE, PlateDifferential::driveShare)
          .with(PlateDifferential.COAST_SHARE, PlateDifferential::coastShare);

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
    positions(layout).forEach(position -> out.put(position, write(all.get(position))));
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
    return map.find(position).map(DifferentialFile::read).orElse(OpenDifferential.IDEAL);
  }

  private static Differential read(YamlNode node) {
    if (!node.isMap()) {
      return node.choice(Map.of(OPEN, OpenDifferential.IDEAL, SPOOL, new Spool()));
    }
    String kind = node.peek(KIND).choice(Map.of(OPEN, OPEN, SPOOL, SPOOL, PLATE, PLATE));
    return switch (kind) {
      case OPEN -> {
        Fields.Numbers n = OPEN_FIELDS.read(node.map(OPEN_FIELDS.keysAnd(KIND)));
        yield new OpenDifferential(n.of(OpenDifferential.FRICTION_SHARE));
      }
      case PLATE -> {
        Fields.Numbers n = PLATE_FIELDS.read(node.map(PLATE_FIELDS.keysAnd(KIND)));
        yield new PlateDifferential(
            n.of(PlateDifferential.PRELOAD),
            n.of(PlateDifferential.DRIVE_SHARE),
            n.of(PlateDifferential.COAST_SHARE));
      }
      default -> {
        node.map(List.of(KIND));
        yield new Spool();
      }
    };
  }

  private static Map<String, Object> write(Differential differential) {
    Map<String, Object> out = new LinkedHashMap<>();
    if (differential instanceof OpenDifferential open) {
      out.put(KIND, OPEN);
      out.putAll(OPEN_FIELDS.write(open));
    } else if (differential instanceof PlateDifferential plate) {
      out.put(KIND, PLATE);
      out.putAll(PLATE_FIELDS.write(plate));
    } else {
      out.put(KIND, SPOOL);
    }
    return out;
  }
}
