package rampwright.optimiser.kit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import rampwright.optimiser.kit.PartsKit.ChangeTimes;
import rampwright.optimiser.kit.PartsKit.PreloadRange;
import rampwright.vehicle.differential.FacePressure;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateHardware;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.differential.preload.DiscSpring;
import rampwright.vehicle.differential.preload.DiscStack;
import rampwright.vehicle.differential.preload.PreloadSprings;
import rampwright.vehicle.file.Fields;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.YamlMap;
import rampwright.vehicle.file.YamlNode;
import rampwright.vehicle.file.YamlReader;
import rampwright.vehicle.file.YamlText;
import rampwright.vehicle.input.InvalidInput;

/**
 * Parts kits as YAML: {@code name}, {@code hardware}, the list {@code ring_sets}, {@code
 * faces_per_side}, {@code preload}, {@code change_times} and, where they are known, the preload
 * {@code springs}.
 */
public final class KitFile {
  private static final String NAME = "name";
  private static final String HARDWARE = "hardware";
  private static final String FACE_PRESSURE = "face_pressure";
  private static final String RING_SETS = "ring_sets";
  private static final String REVERSIBLE = "reversible";
  private static final String PRELOAD = "preload";
  private static final String CHANGE_TIMES = "change_times";
  private static final String SPRINGS = "springs";

  private static final Fields<PlateHardware> HARDWARE_FIELDS =
      Fields.<PlateHardware>none()
          .with(PlateHardware.OUTER_RADIUS, PlateHardware::plateOuterRadius)
          .with(PlateHardware.INNER_RADIUS, PlateHardware::plateInnerRadius)
          .with(PlateHardware.PLATE_FRICTION, PlateHardware::plateFriction)
          .with(PlateHardware.RAMP_RADIUS, PlateHardware::rampRadius)
          .with(PlateHardware.RAMP_FRICTION, PlateHardware::rampFriction);

  private static final Fields<RingSet> RING_SET_FIELDS =
      Fields.<RingSet>none()
          .with(RingSet.DRIVE_ANGLE, RingSet::driveAngle)
          .with(RingSet.COAST_ANGLE, RingSet::coastAngle);

  private static final Fields<PreloadRange> PRELOAD_FIELDS =
      Fields.<PreloadRange>none()
          .with(PreloadRange.MIN, PreloadRange::min)
          .with(PreloadRange.MAX, PreloadRange::max)
          .with(PreloadRange.STEP, PreloadRange::step);

  private static final Fields<ChangeTimes> TIME_FIELDS =
      Fields.<ChangeTimes>none()
          .with(ChangeTimes.PRELOAD, ChangeTimes::preload)
          .with(ChangeTimes.FACES, ChangeTimes::faces)
          .with(ChangeTimes.RING_SET, ChangeTimes::ringSet);

  private static final Fields<PreloadSprings> SPRING_FIELDS =
      Fields.<PreloadSprings>none()
          .with(DiscSpring.OUTER_DIAMETER, springs -> springs.stack().spring().outerDiameter())
          .with(DiscSpring.INNER_DIAMETER, springs -> springs.stack().spring().innerDiameter())
          .with(DiscSpring.THICKNESS, springs -> springs.stack().spring().thickness())
          .with(DiscSpring.CONE_HEIGHT, springs -> springs.stack().spring().coneHeight())
          .with(PreloadSprings.ROOM, PreloadSprings::room);

  private KitFile() {}

  /**
   * Reads a kit file.
   *
   * @throws InvalidInput when it breaks a rule
   */
  public static PartsKit read(FileSource source, String path) {
    return read(YamlReader.read(source, path));
  }

  /**
   * Reads a kit from a node of a larger file.
   *
   * @throws InvalidInput when it breaks a rule
   */
  public static PartsKit read(YamlNode node) {
    String faces = PlateBuild.FACES_PER_SIDE.key();
    YamlMap map =
        node.map(List.of(NAME, HARDWARE, RING_SETS, faces, PRELOAD, CHANGE_TIMES, SPRINGS));
    String name = map.get(NAME).text();
    PlateHardware hardware = hardware(map.get(HARDWARE));
    List<RingSet> ringSets = map.get(RING_SETS).items().stream().map(KitFile::ringSet).toList();
    List<Integer> facesPerSide =
        map.get(faces).items().stream()
            .map(item -> item.wholeNumber(PlateBuild.FACES_PER_SIDE))
            .toList();
    PreloadRange preload = preload(map.get(PRELOAD));
    ChangeTimes times = times(map.get(CHANGE_TIMES));
    Optional<PreloadSprings> springs = map.find(SPRINGS).map(KitFile::springs);
    return map.place(
        () -> new PartsKit(name, hardware, ringSets, facesPerSide, preload, times, springs));
  }

  /** Returns a kit as the text of a file. */
  public static String write(PartsKit kit) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(NAME, kit.name());
    Map<String, Object> hardware = HARDWARE_FIELDS.write(kit.hardware());
    hardware.put(FACE_PRESSURE, kit.hardware().pressure().name().toLowerCase(Locale.ROOT));
    out.put(HARDWARE, hardware);
    out.put(RING_SETS, kit.ringSets().stream().map(KitFile::write).toList());
    out.put(PlateBuild.FACES_PER_SIDE.key(), kit.facesPerSide());
    out.put(PRELOAD, PRELOAD_FIELDS.write(kit.preload()));
    out.put(CHANGE_TIMES, TIME_FIELDS.write(kit.changeTimes()));
    kit.springs().ifPresent(springs -> out.put(SPRINGS, write(springs)));
    return YamlText.write(out);
  }

  private static Map<String, Object> write(RingSet set) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(NAME, set.name());
    out.putAll(RING_SET_FIELDS.write(set));
    out.put(REVERSIBLE, set.reversible());
    return out;
  }

  private static Map<String, Object> write(PreloadSprings springs) {
    Map<String, Object> out = SPRING_FIELDS.write(springs);
    out.put(DiscStack.PARALLEL.key(), springs.stack().parallel());
    out.put(DiscStack.SERIES.key(), springs.stack().series());
    return out;
  }

  private static PreloadSprings springs(YamlNode node) {
    String parallel = DiscStack.PARALLEL.key();
    String series = DiscStack.SERIES.key();
    YamlMap map = node.map(SPRING_FIELDS.keysAnd(parallel, series));
    Fields.Numbers n = SPRING_FIELDS.read(map);
    return map.place(
        () ->
            new PreloadSprings(
                new DiscStack(
                    new DiscSpring(
                        n.of(DiscSpring.OUTER_DIAMETER),
                        n.of(DiscSpring.INNER_DIAMETER),
                        n.of(DiscSpring.THICKNESS),
                        n.of(DiscSpring.CONE_HEIGHT)),
                    map.get(parallel).wholeNumber(DiscStack.PARALLEL),
                    map.get(series).wholeNumber(DiscStack.SERIES)),
                n.of(PreloadSprings.ROOM)));
  }

  private static PlateHardware hardware(YamlNode node) {
    YamlMap map = node.map(HARDWARE_FIELDS.keysAnd(FACE_PRESSURE));
    Fields.Numbers n = HARDWARE_FIELDS.read(map);
    FacePressure pressure = map.get(FACE_PRESSURE).choice(YamlNode.names(FacePressure.class));
    return map.place(
        () ->
            new PlateHardware(
                n.of(PlateHardware.OUTER_RADIUS),
                n.of(PlateHardware.INNER_RADIUS),
                n.of(PlateHardware.PLATE_FRICTION),
                n.of(PlateHardware.RAMP_RADIUS),
                n.of(PlateHardware.RAMP_FRICTION),
                pressure));
  }

  private static RingSet ringSet(YamlNode node) {
    YamlMap map = node.map(RING_SET_FIELDS.keysAnd(NAME, REVERSIBLE));
    String name = map.get(NAME).text();
    Fields.Numbers n = RING_SET_FIELDS.read(map);
    boolean reversible = map.get(REVERSIBLE).flag();
    return map.place(
        () -> new RingSet(name, n.of(RingSet.DRIVE_ANGLE), n.of(RingSet.COAST_ANGLE), reversible));
  }

  private static PreloadRange preload(YamlNode node) {
    Fields.Numbers n = PRELOAD_FIELDS.read(node);
    return node.place(
        () ->
            new PreloadRange(
                n.of(PreloadRange.MIN), n.of(PreloadRange.MAX), n.of(PreloadRange.STEP)));
  }

  private static ChangeTimes times(YamlNode node) {
    Fields.Numbers n = TIME_FIELDS.read(node);
    return new ChangeTimes(
        n.of(ChangeTimes.PRELOAD), n.of(ChangeTimes.FACES), n.of(ChangeTimes.RING_SET));
  }
}
