package rampwright.optimiser.event;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.differential.OpenDifferential;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.file.DifferentialFile;
import rampwright.vehicle.file.Fields;
import rampwright.vehicle.file.YamlMap;
import rampwright.vehicle.file.YamlNode;

/**
 * One setting as YAML: its {@code name} and either {@code kit}, what the crew fits, or {@code
 * differentials}, laws to compare with. A car with all wheels driven has the kit's unit in its rear
 * axle and may name the other two with {@code differentials} beside {@code kit}.
 */
final class SettingFile {
  private static final String NAME = "name";
  private static final String KIT = "kit";
  private static final String DIFFERENTIALS = "differentials";
  private static final String FRONT = "front";
  private static final String CENTRE = "centre";
  private static final String REAR = "rear";
  private static final String RING_SET = "ring_set";
  private static final String TURNED = "turned";

  private static final DifferentialSet NONE = DifferentialSet.rear(OpenDifferential.IDEAL);

  private static final Fields<KitSetting> KIT_FIELDS =
      Fields.<KitSetting>none().with(PlateDifferential.PRELOAD, KitSetting::preload);

  private SettingFile() {}

  static NamedSetting read(YamlNode node, PartsKit kit, DriveLayout layout) {
    YamlMap map = node.map(List.of(NAME, KIT, DIFFERENTIALS));
    String name = map.get(NAME).text();
    Optional<YamlNode> fitted = map.find(KIT);
    Optional<YamlNode> laws = map.find(DIFFERENTIALS);
    boolean beside = layout == DriveLayout.ALL && fitted.isPresent();
    if (fitted.isPresent() == laws.isPresent() && !beside) {
      throw node.fault(
          "setting",
          fitted.isPresent() ? "kit and differentials" : "neither kit nor differentials",
          "either a kit setting or a set of differentials",
          "");
    }
    DifferentialSet others = laws.map(value -> laws(value, layout, beside)).orElse(NONE);
    return fitted
        .map(value -> fitted(name, value, kit, layout, others))
        .orElseGet(() -> new NamedSetting(name, Optional.empty(), others));
  }

  private static DifferentialSet laws(YamlNode node, DriveLayout layout, boolean beside) {
    if (beside && node.map(List.of(FRONT, CENTRE, REAR)).find(REAR).isPresent()) {
      throw node.fault("rear differential", "given twice", "the kit's", "leave out one of the two");
    }
    return DifferentialFile.readSet(node, layout);
  }

  static Map<String, Object> write(NamedSetting setting, DriveLayout layout) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(NAME, setting.name());
    setting.kitSetting().ifPresent(fitted -> out.put(KIT, write(fitted)));
    Map<String, Object> laws = DifferentialFile.writeSet(setting.differentials(), layout);
    if (setting.kitSetting().isPresent()) {
      laws.remove(layout == DriveLayout.FRONT ? FRONT : REAR);
    }
    if (!laws.isEmpty()) {
      out.put(DIFFERENTIALS, laws);
    }
    return out;
  }

  private static NamedSetting fitted(
      String name, YamlNode node, PartsKit kit, DriveLayout layout, DifferentialSet others) {
    String faces = PlateBuild.FACES_PER_SIDE.key();
    YamlMap map = node.map(KIT_FIELDS.keysAnd(RING_SET, TURNED, faces));
    KitSetting setting =
        new KitSetting(
            map.get(RING_SET).text(),
            map.find(TURNED).map(YamlNode::flag).orElse(false),
            map.get(faces).wholeNumber(PlateBuild.FACES_PER_SIDE),
            KIT_FIELDS.read(map).of(PlateDifferential.PRELOAD));
    return map.place(() -> NamedSetting.of(name, kit, setting, layout, others));
  }

  private static Map<String, Object> write(KitSetting setting) {
    Map<String, Object> out = new LinkedHashMap<>();
    out.put(RING_SET, setting.ringSet());
    out.put(TURNED, setting.turned());
    out.put(PlateBuild.FACES_PER_SIDE.key(), setting.facesPerSide());
    out.putAll(KIT_FIELDS.write(setting));
    return out;
  }
}
