package rampwright.optimiser.sheet;

import java.util.Comparator;
import java.util.List;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.sheet.SetupSheet.CornerEffect;
import rampwright.optimiser.sheet.SetupSheet.ExpectedLap;
import rampwright.optimiser.sheet.SetupSheet.LimitLine;

/** What the laps say: lap times, corners, and the event's limits. */
final class EffectSection {
  /** Circuits with a table of corners of their own. */
  private static final int MOST_TABLES = 2;

  private final SetupSheet sheet;
  private final int most;
  private final Markup html = new Markup();

  EffectSection(SetupSheet sheet, int most) {
    this.sheet = sheet;
    this.most = most;
  }

  String html() {
    laps();
    corners();
    limits();
    return html.toString();
  }

  private void laps() {
    html.heading("Expected lap against the setting in the car (computed, driver's limits)")
        .raw("<table class='rows'><tr><th style='width:31%'>Circuit</th>")
        .raw("<th class='num'>Weight</th><th class='num'>In the car</th>")
        .raw("<th class='num'>This setting</th><th class='num'>Difference</th>")
        .raw("<th class='num' style='width:17%'>Band</th></tr>");
    for (ExpectedLap lap : sheet.laps()) {
      html.raw("<tr>")
          .cell("", Shown.cut(lap.circuit(), SheetHtml.LONGEST_NAME))
          .cell("num", Shown.brief(lap.weight(), 2))
          .cell("num", Shown.lapTime(lap.currentLapTime()))
          .cell("num", Shown.lapTime(lap.lapTime()))
          .raw("<td class='num'>")
          .element("b", "", Shown.signed(lap.difference(), 3) + "\u00a0s")
          .raw("</td>")
          .cell("num", band(lap))
          .raw("</tr>");
    }
    html.raw("</table>")
        .element(
            "p",
            "class='small'",
            "Minus is faster. Band: plate friction ±15 % in both settings, preload as on the bench."
                + " A driver's laps scatter by 0.1 to 0.2 s: a smaller difference shows in no single"
                + " lap (both figures: common practice, no source).");
  }

  private static String band(ExpectedLap lap) {
    return Shown.signed(lap.lowest(), 3) + " to " + Shown.signed(lap.highest(), 3) + "\u00a0s";
  }

  private void corners() {
    List<ExpectedLap> shown =
        sheet.laps().stream().filter(lap -> !lap.corners().isEmpty()).limit(MOST_TABLES).toList();
    if (shown.isEmpty()) {
      return;
    }
    html.raw("<table class='cols'><tr>");
    for (ExpectedLap lap : shown) {
      html.raw(lap == shown.get(0) ? "<td class='col'>" : "<td class='gap'>");
      corners(lap);
      html.raw("</td>");
    }
    html.raw(shown.size() == 1 ? "<td class='col'></td></tr></table>" : "</tr></table>");
  }

  private void corners(ExpectedLap lap) {
    List<CornerEffect> listed = listed(lap.corners());
    html.element("p", "class='sub'", Shown.cut(lap.circuit(), 45) + ", corner by corner")
        .raw("<table class='rows small'><tr><th style='width:14%'>Corner</th>")
        .raw(
            "<th style='width:17%' class='num'>at m</th><th style='width:17%' class='num'>km/h</th>")
        .raw("<th style='width:20%' class='num'>Diff. s</th><th>Mainly</th></tr>");
    double rest = lap.difference();
    for (CornerEffect corner : listed) {
      rest -= corner.difference();
      html.raw("<tr>")
          .cell("", Integer.toString(corner.number()))
          .cell("num", Shown.number(corner.distance(), 0))
          .cell("num", Shown.number(corner.slowestSpeed() * 3.6, 0))
          .cell("num", Shown.signed(corner.difference(), 3))
          .cell("", corner.cause())
          .raw("</tr>");
    }
    int left = lap.corners().size() - listed.size();
    html.raw("<tr><td colspan='3'>")
        .words(left == 0 ? "elsewhere" : left + " more corners and elsewhere")
        .raw("</td>")
        .cell("num", Shown.signed(rest, 3))
        .raw("<td></td></tr></table>");
  }

  /** The corners in driving order; when there are too many, those that differ most. */
  private List<CornerEffect> listed(List<CornerEffect> corners) {
    return corners.stream()
        .sorted(Comparator.comparingDouble(c -> -Math.abs(c.difference())))
        .limit(most)
        .sorted(Comparator.comparingInt(CornerEffect::number))
        .toList();
  }

  private void limits() {
    if (sheet.limits().isEmpty()) {
      html.heading("Limits").element("p", "", "The event sets no limits.");
      return;
    }
    html.heading("Limits of the event");
    html.raw("<table class='cols'><tr>");
    int half = (sheet.limits().size() + 1) / 2;
    html.raw("<td class='col'>");
    limits(sheet.limits().subList(0, half));
    html.raw("</td><td class='gap'>");
    limits(sheet.limits().subList(half, sheet.limits().size()));
    html.raw("</td></tr></table>");
  }

  private void limits(List<LimitLine> lines) {
    if (lines.isEmpty()) {
      return;
    }
    html.raw("<table class='rows small'><tr><th style='width:40%'>Measure</th>")
        .raw(
            "<th class='num'>Limit</th><th class='num'>Value</th><th style='width:17%'></th></tr>");
    for (LimitLine line : lines) {
      LimitedMeasure measure = line.limit().measure();
      html.raw("<tr>")
          .cell("", measure.quantity().label())
          .cell(
              "num",
              (measure.lower() ? "≥ " : "≤ ") + Shown.of(measure.quantity(), line.limit().value()))
          .cell(
              "num",
              line.value().isPresent()
                  ? Shown.of(measure.quantity(), line.value().getAsDouble())
                  : "none on this lap")
          .raw("<td>")
          .element("b", "", line.met().map(met -> met ? "met" : "BROKEN").orElse(""))
          .raw("</td></tr>");
    }
    html.raw("</table>");
  }
}
