package rampwright.optimiser.search;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import rampwright.optimiser.kit.KitFile;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.kit.PartsKit;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.file.FileSource;

/** Searches over the sample kit with objectives that need no lap. */
final class SearchProblems {
  static final PartsKit KIT =
      KitFile.read(
          FileSource.classPath(SearchProblems.class.getClassLoader(), SampleFiles.BASE),
          "kits/plate_kit.yaml");

  static final KitSetting CURRENT = new KitSetting("55/75", false, 4, 40);

  private SearchProblems() {}

  /** Returns a problem from an objective (s) and a violation (-) of each law. */
  static SearchProblem of(
      ToDoubleFunction<PlateDifferential> objective,
      ToDoubleFunction<PlateDifferential> violation) {
    return new SearchProblem(
        SettingSpace.of(KIT),
        setting -> evaluated(setting, objective, violation),
        law -> 0,
        SearchProblem.MEASURABLE,
        Optional.of(CURRENT));
  }

  static EvaluatedSetting evaluated(
      KitSetting setting,
      ToDoubleFunction<PlateDifferential> objective,
      ToDoubleFunction<PlateDifferential> violation) {
    PlateDifferential law = KIT.build(setting).law();
    return new EvaluatedSetting(
        setting,
        law,
        objective.applyAsDouble(law),
        Map.of(),
        List.of(),
        violation.applyAsDouble(law));
  }

  /** A lap time (s) with several valleys, 20 s per unit around the deepest. */
  static double valleys(PlateDifferential law) {
    double p = (law.preload() - 85) / 140;
    double d = Math.log1p(law.driveShare() / 0.1) - 1.2;
    double c = Math.log1p(law.coastShare() / 0.1) - 0.5;
    return 70
        + 0.4 * (p * p + d * d + c * c)
        + 0.05 * (3 - Math.cos(9 * p) - Math.cos(7 * d) - Math.cos(7 * c));
  }
}
