package rampwright.optimiser.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import rampwright.vehicle.Conditions;

/** The page of a sheet as XHTML: head, what to build, how to check it, what to expect. */
final class SheetHtml {
  /** Longest name that is printed whole. */
  static final int LONGEST_NAME = 90;

  /** Font size (pt) down to which drawings keep their size. */
  private static final double USUAL_SIZE = 8;

  /** Words shorter than this stay on one line. */
  private static final int LONGEST_WHOLE = 40;

  private final SetupSheet sheet;
  private final Markup page = new Markup();

  private SheetHtml(SetupSheet sheet) {
    this.sheet = sheet;
  }

  /**
   * Returns the page.
   *
   * @param style the style sheet
   * @param size font size (pt)
   * @param corners most corners to be listed for one circuit
   */
  static String of(SetupSheet sheet, String style, double size, int corners) {
    SheetHtml html = new SheetHtml(sheet);
    html.page
        .raw("<html><head><title>")
        .words("Setup sheet: " + sheet.setting())
        .raw(
            "</title><style>" + style + "body { font-size: " + size + "pt; }</style></head><body>");
    html.head();
    html.facts();
    html.page.raw(new BuildSection(sheet, Math.min(1, size / USUAL_SIZE)).html());
    html.benchAndChange();
    html.page.raw(new EffectSection(sheet, corners).html());
    html.cautions();
    html.signatures();
    return html.page.raw("</body></html>").toString();
  }

  private void head() {
    page.raw("<table class='head'><tr><td style='width:13mm'>" + mark() + "</td><td>")
        .element("div", "class='kind'", kind())
        .element("h1", "", name(sheet.setting()))
        .raw("</td><td style='width:33mm'><div class='box'>&#160;Date</div></td>")
        .raw("<td style='width:33mm'><div class='box'>&#160;Unit no.</div></td></tr></table>");
  }

  private String kind() {
    return "SETUP SHEET · PLATE DIFFERENTIAL · " + sheet.axle().toUpperCase(Locale.ROOT);
  }

  /** The mark: a ramp under a pin. */
  private static String mark() {
    Drawing drawing = new Drawing(10, 9);
    drawing.polygon("fill='#000'", 0, 8.6, 10, 8.6, 10, 2.6);
    drawing.circle(3.6, 3.3, 2.2, "fill='none' stroke='#000' stroke-width='0.7'");
    return drawing.svg(1);
  }

  private void facts() {
    page.raw("<table class='facts'><tr>");
    fact("Event", List.of(name(sheet.event())));
    fact("Car", List.of(name(sheet.car())));
    fact("Parts kit", List.of(name(sheet.kit())));
    page.raw("</tr></table><table class='facts'><tr>");
    fact("Conditions", conditions(sheet.conditions()));
    fact(
        "Driver backs off at slide growth",
        List.of(
            Shown.number(sheet.driver().powerGrowth(), 1) + " 1/s on power,",
            Shown.number(sheet.driver().brakingGrowth(), 1) + " 1/s braking in a turn"));
    page.raw("</tr></table>");
  }

  /** Adds a fact; a line may end between its words, and within them only when they are too long. */
  private void fact(String label, List<String> words) {
    page.raw("<td>").element("b", "", label + ":");
    for (String word : words) {
      boolean whole = word.length() < LONGEST_WHOLE;
      page.raw(" ").element("span", whole ? "style='white-space:nowrap'" : "", word);
    }
    page.raw("</td>");
  }

  private static List<String> conditions(Conditions c) {
    List<String> words = new ArrayList<>();
    words.add("grip " + Shown.brief(c.grip(), 3) + ",");
    words.add("fuel " + Shown.brief(c.fuelMass(), 1) + " kg,");
    words.add("air " + Shown.brief(c.airDensity(), 3) + " kg/m³,");
    if (c.windSpeed() == 0) {
      words.add("no wind");
    } else {
      words.add("wind " + Shown.brief(c.windSpeed(), 1) + " m/s");
      words.add("from " + Shown.degrees(c.windFrom()) + " to the circuit's x axis");
    }
    return words;
  }

  private void benchAndChange() {
    page.raw("<table class='cols'><tr><td class='col' style='width:117mm'>")
        .raw(new BenchSection(sheet).html())
        .raw("</td><td class='gap'>")
        .heading("Change from “" + name(sheet.change().from()) + "”, now in the car");
    List<String> steps = sheet.change().steps();
    if (steps.isEmpty()) {
      page.element("p", "", "Nothing to change: this is the setting in the car. Check it only.");
    } else {
      steps.forEach(step -> page.element("p", "class='tick'", "☐ " + step));
    }
    page.element("p", "", time()).raw("</td></tr></table>");
  }

  private String time() {
    if (sheet.change().time().isEmpty()) {
      return "Time needed: not in the kit.";
    }
    double minutes = sheet.change().time().getAsDouble() / 60;
    return "Time needed: " + Shown.brief(minutes, 0) + " min, on stands with the tools laid out.";
  }

  private void cautions() {
    page.raw("<div class='warn'>").element("b", "", "Caution").raw("<ul>");
    sheet.cautions().forEach(caution -> page.element("li", "class='small'", caution));
    page.raw("</ul></div>");
  }

  private void signatures() {
    page.raw("<table class='signatures'><tr>");
    for (String who : List.of("Built by", "Bench checked by", "Released by")) {
      page.raw("<td class='fill' style='height:2.6em'>")
          .element("span", "class='small'", who + " (name, date, signature)")
          .raw("</td>");
    }
    page.raw("</tr></table>")
        .raw("<div class='notes'>")
        .heading("Notes of crew and driver")
        .raw("</div>");
  }

  /** Returns a name, cut where it is too long for any sheet. */
  static String name(String name) {
    return Shown.cut(name, LONGEST_NAME);
  }
}
