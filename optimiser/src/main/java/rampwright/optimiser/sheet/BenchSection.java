package rampwright.optimiser.sheet;

import rampwright.optimiser.sheet.BenchCheck.Target;
import rampwright.vehicle.differential.preload.DiscSpring;

/** What the bench must show, with boxes for what it did show. */
final class BenchSection {
  private final SetupSheet sheet;
  private final Markup html = new Markup();

  BenchSection(SetupSheet sheet) {
    this.sheet = sheet;
  }

  String html() {
    BenchCheck bench = sheet.bench();
    html.heading("Bench check: breakaway torque at a wheel, N·m")
        .raw("<table class='rows'><tr><th style='width:43%'>Way of measuring</th>")
        .raw("<th style='width:13%' class='num'>Target</th>")
        .raw("<th style='width:22%' class='num'>Accept</th>")
        .raw("<th>Left</th><th>Right</th></tr>");
    row("Propshaft FREE, one wheel held, turn the other", bench.wheelHeld());
    row("Propshaft LOCKED, one wheel free, turn the other forwards", bench.lockedForwards());
    row("Propshaft LOCKED, one wheel free, turn the other backwards", bench.lockedBackwards());
    html.raw("</table>").element("p", "class='small'", explanation());
    shims();
    html.raw("<table><tr>");
    for (String measured : new String[] {"Stack height L / R, mm", "Shims L / R, mm", "Oil"}) {
      html.raw("<td class='fill' style='height:2.3em'>")
          .element("span", "class='small'", measured)
          .raw("</td>");
    }
    return html.raw("</tr></table>").toString();
  }

  private void row(String way, Target target) {
    html.raw("<tr>").cell("", way);
    html.raw("<td class='num'>").element("b", "", reading(target.value())).raw("</td>");
    html.cell("num", band(target));
    html.raw("<td class='fill'>&#160;</td><td class='fill'>&#160;</td></tr>");
  }

  private static String reading(double torque) {
    return Double.isFinite(torque) ? Shown.brief(torque, 1) : "holds";
  }

  private static String band(Target target) {
    if (!target.breaksAway()) {
      return "do not force";
    }
    return Double.isInfinite(target.high())
        ? Shown.brief(target.low(), 1) + " or more"
        : Shown.brief(target.low(), 1) + " – " + Shown.brief(target.high(), 1);
  }

  private void shims() {
    if (!sheet.springsKnown()) {
      return;
    }
    html.raw("<p>");
    if (sheet.shims().isEmpty()) {
      html.element("b", "", "The kit's springs do not give this preload")
          .words(" with this number of faces: fit other springs and check on the bench.");
    } else {
      shims(sheet.shims().get());
    }
    html.raw("</p>");
  }

  private void shims(Shims shims) {
    DiscSpring spring = shims.stack().spring();
    html.element("b", "", "Shims " + shims.millimetres() + " mm on each side")
        .words(
            " to start with (0.05 mm more gives "
                + Shown.signed(shims.rate() * 0.05e-3, 1)
                + " N·m of P). Disc springs "
                + shims.stack().parallel()
                + " parallel × "
                + shims.stack().series()
                + " in series, "
                + millimetres(spring.outerDiameter())
                + " × "
                + millimetres(spring.innerDiameter())
                + " × "
                + millimetres(spring.thickness())
                + ", cone height "
                + millimetres(spring.coneHeight())
                + " mm, pressed "
                + Shown.number(shims.deflection() * 1e3, 2)
                + " mm."
                + (shims.reliable()
                    ? ""
                    : " Nearly flat: real springs are stiffer here than computed."));
  }

  private static String millimetres(double length) {
    return Shown.brief(length * 1e3, 2);
  }

  private String explanation() {
    return "The springs alone give a whole torque difference of P = "
        + Shown.torque(sheet.bench().springsAlone().value())
        + "; with the propshaft free a wheel shows half of it. A locked propshaft also loads the"
        + " ramps: P/(1 − k), k "
        + Shown.brief(sheet.build().law().coastShare(), 3)
        + " forwards (coast), "
        + Shown.brief(sheet.build().law().driveShare(), 3)
        + " backwards (drive); from k = 1 on it holds. Band: plate friction ±15 % (common practice)"
        + " or half a shim step.";
  }
}
