package rampwright.optimiser.search;

import java.util.Arrays;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.vehicle.differential.PlateDifferential;

/**
 * True laps of the short ring at every 25th setting of the sample kit, as cubic functions of the
 * law: cheap enough to know the best of all settings, and of the shape that laps have.
 */
final class LapTable {
  private static final int EVERY = 25;
  private static final int DEGREE = 3;

  private final double[] time;
  private final double[] understeer;
  private final double explained;

  private LapTable(double[] time, double[] understeer, double explained) {
    this.time = time;
    this.understeer = understeer;
    this.explained = explained;
  }

  static LapTable ofTheShortRing() {
    Event event = ShortEvent.free();
    SettingSpace space = SettingSpace.of(event.kit());
    SettingEvaluator evaluator = SettingEvaluator.of(event);
    int count = (space.size() - 1) / EVERY + 1;
    double[][] x = new double[count][];
    double[] times = new double[count];
    double[] angles = new double[count];
    for (int i = 0; i < count; i++) {
      EvaluatedSetting setting = evaluator.evaluate(space.setting(i * EVERY));
      x[i] = terms(setting.law());
      times[i] = setting.lapTime();
      angles[i] = setting.measures().get(LimitedMeasure.EXIT_UNDERSTEER_CHANGE);
    }
    OLSMultipleLinearRegression fit = new OLSMultipleLinearRegression();
    fit.setNoIntercept(true);
    fit.newSampleData(angles, x);
    double[] understeer = fit.estimateRegressionParameters();
    fit.newSampleData(times, x);
    // the constant is among the terms, so the total sum of squares is taken about the mean here
    double mean = Arrays.stream(times).average().orElseThrow();
    double total = Arrays.stream(times).map(t -> (t - mean) * (t - mean)).sum();
    double explained = 1 - fit.calculateResidualSumOfSquares() / total;
    return new LapTable(fit.estimateRegressionParameters(), understeer, explained);
  }

  /** Returns the share of the scatter of the lap times that the table explains (-). */
  double explained() {
    return explained;
  }

  double lapTime(PlateDifferential law) {
    return value(time, law);
  }

  /** Returns the understeer angle on exits less that of the current setting (rad). */
  double understeerChange(PlateDifferential law) {
    return value(understeer, law);
  }

  private static double value(double[] factors, PlateDifferential law) {
    double[] terms = terms(law);
    double sum = 0;
    for (int i = 0; i < terms.length; i++) {
      sum += factors[i] * terms[i];
    }
    return sum;
  }

  private static double[] terms(PlateDifferential law) {
    double p = (law.preload() - 80) / 70;
    double d = Math.log1p(law.driveShare() / 0.1);
    double c = Math.log1p(law.coastShare() / 0.1);
    double[] terms = new double[20];
    int n = 0;
    for (int i = 0; i <= DEGREE; i++) {
      for (int j = 0; i + j <= DEGREE; j++) {
        for (int k = 0; i + j + k <= DEGREE; k++) {
          terms[n++] = Math.pow(p, i) * Math.pow(d, j) * Math.pow(c, k);
        }
      }
    }
    return terms;
  }
}
