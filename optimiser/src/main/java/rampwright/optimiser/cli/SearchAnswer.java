package rampwright.optimiser.cli;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.kit.KitSetting;
import rampwright.optimiser.search.AlikeGroup;
import rampwright.optimiser.search.EvaluatedSetting;
import rampwright.optimiser.search.GainBand;
import rampwright.optimiser.search.LimitCheck;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;
import rampwright.optimiser.search.SettingEvaluator;
import rampwright.optimiser.search.SettingSpace;
import rampwright.optimiser.search.UnsolvedSetting;
import rampwright.vehicle.input.Quantity;

/**
 * The answer of a search as a document and as text.
 *
 * @param request what was asked
 * @param result what was found
 * @param current the setting that is in the car now; empty when the kit does not build it
 * @param gain how far the best's gain over it can be trusted; empty when no setting meets the
 *     limits
 */
record SearchAnswer(
    SearchRequest request,
    SearchResult result,
    Optional<EvaluatedSetting> current,
    Optional<GainBand> gain) {
  static SearchAnswer of(SearchRequest request, SettingEvaluator evaluator, SearchResult result) {
    Optional<KitSetting> fitted = request.event().current().kitSetting();
    Optional<GainBand> gain =
        result.feasible()
            ? Optional.of(GainBand.of(request.event(), result.best().setting()))
            : Optional.empty();
    return new SearchAnswer(request, result, fitted.map(evaluator::evaluate), gain);
  }

  Map<String, Object> document() {
    JsonMap search = new JsonMap();
    search.put("method", result.method().label());
    search.put("seed", result.seed());
    search.put("evaluations", result.evaluations());
    search.put("mostEvaluations", request.maxEvaluations());
    search.put("settingsOfTheKit", SettingSpace.of(event().kit()).size());
    search.put("meetsLimits", result.feasible());
    search.put("best", setting(result.best()).map());
    search.put("current", current.map(this::setting).orElse(null));
    search.put("gain", gain.map(SearchAnswer::gain).orElse(null));
    search.put("alternatives", result.alike().stream().map(this::alternative).toList());
    search.put("unsolved", result.unsolved().stream().map(this::unsolved).toList());
    search.put("history", result.history().stream().map(SearchAnswer::progress).toList());
    return new JsonMap()
        .put("event", event().name())
        .put("version", ProgramVersion.text())
        .put("search", search)
        .map();
  }

  private Map<String, Object> unsolved(UnsolvedSetting failed) {
    return new JsonMap()
        .putAll(SettingWords.document(event(), failed.setting()))
        .put("reason", failed.reason())
        .map();
  }

  private JsonMap setting(EvaluatedSetting setting) {
    return new JsonMap()
        .putAll(SettingWords.document(event(), setting.setting()))
        .put("lapTimeS", setting.lapTime())
        .put("meetsLimits", setting.feasible())
        .put("limits", setting.limits().stream().map(SearchAnswer::limit).toList());
  }

  private Map<String, Object> alternative(AlikeGroup group) {
    return setting(group.setting())
        .put("changeTimeS", group.changeTime())
        .put("lowestPreloadNm", group.lowestPreload())
        .put("highestPreloadNm", group.highestPreload())
        .put("settings", group.settings())
        .map();
  }

  private static Map<String, Object> gain(GainBand band) {
    return new JsonMap()
        .put("gainS", band.gain())
        .put("lowS", band.low())
        .put("highS", band.high())
        .put("measurableS", band.measurable())
        .put("verdict", band.verdict().label())
        .put("shares", band.shares().stream().map(SearchAnswer::share).toList())
        .map();
  }

  private static Map<String, Object> share(GainBand.Share share) {
    return new JsonMap().put("source", share.source()).put("halfWidthS", share.seconds()).map();
  }

  /** A limit carries its unit in its name, which is that of the event's file. */
  private static Map<String, Object> limit(LimitCheck check) {
    Quantity quantity = check.limit().measure().quantity();
    return new JsonMap()
        .put("name", quantity.key())
        .put("unit", quantity.unit())
        .put("limit", check.limit().value() / quantity.siPerUnit())
        .put("value", check.value() / quantity.siPerUnit())
        .put("met", check.met())
        .map();
  }

  private static Map<String, Object> progress(SearchProgress progress) {
    return new JsonMap()
        .put("generation", progress.generation())
        .put("evaluations", progress.evaluations())
        .put("bestLapTimeS", progress.bestLapTime())
        .put("bestMeetsLimits", progress.bestFeasible())
        .map();
  }

  String text() {
    StringBuilder out = new StringBuilder();
    out.append(event().name()).append(": ").append(result.method().label());
    out.append(", ").append(result.evaluations()).append(" evaluations, seed ");
    out.append(result.seed()).append("\n\n");
    TextTable table = new TextTable();
    current.ifPresent(now -> row(table, "current", now, ""));
    row(table, "best", result.best(), "");
    for (AlikeGroup group : result.alike()) {
      if (!group.setting().setting().equals(result.best().setting())) {
        String minutes = Shown.number(group.changeTime() / 60, 0) + " min to change";
        row(table, "alike", group.setting(), minutes);
      }
    }
    out.append(table);
    gain.ifPresent(band -> out.append('\n').append(gainText(band)));
    if (!result.best().limits().isEmpty()) {
      out.append("\nlimits of the best\n").append(limits());
    }
    if (!result.unsolved().isEmpty()) {
      out.append("\n").append(result.unsolved().size()).append(" laps could not be solved, ");
      out.append("the first: ").append(result.unsolved().get(0).reason()).append('\n');
    }
    return out.toString();
  }

  private static String gainText(GainBand band) {
    TextTable shares = new TextTable();
    for (GainBand.Share share : band.shares()) {
      shares.row("  " + share.source(), "±" + Shown.number(share.seconds(), 3), "s");
    }
    return "gain over the current setting "
        + Shown.signed(band.gain(), 3)
        + " s, between "
        + Shown.signed(band.low(), 3)
        + " and "
        + Shown.signed(band.high(), 3)
        + " s: "
        + band.verdict().label()
        + "\n"
        + shares;
  }

  private static void row(TextTable table, String label, EvaluatedSetting setting, String note) {
    String time = Shown.number(setting.lapTime(), 3) + " s";
    table.row(
        label + ": " + SettingWords.parts(setting.setting()),
        time,
        setting.feasible() ? "meets the limits" : "breaks a limit",
        note);
  }

  private TextTable limits() {
    TextTable table = new TextTable();
    for (LimitCheck check : result.best().limits()) {
      LimitedMeasure measure = check.limit().measure();
      Quantity quantity = measure.quantity();
      table.row(
          "  " + quantity.label(),
          Shown.number(check.value() / quantity.siPerUnit(), 3),
          measure.lower() ? "at least" : "at most",
          Shown.number(check.limit().value() / quantity.siPerUnit(), 3),
          quantity.unit(),
          check.met() ? "met" : "not met");
    }
    return table;
  }

  /** Returns what the best setting of a search without a feasible one breaks. */
  String unmet() {
    List<LimitCheck> broken =
        result.best().limits().stream().filter(check -> !check.met()).toList();
    return "No setting meets the limits. The nearest breaks: "
        + broken.stream()
            .map(check -> check.limit().measure().quantity().key())
            .collect(Collectors.joining(", "))
        + ". Maybe relax one of them in the event.";
  }

  private Event event() {
    return request.event();
  }
}
