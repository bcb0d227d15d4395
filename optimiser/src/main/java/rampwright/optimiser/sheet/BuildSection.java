package rampwright.optimiser.sheet;

import java.util.List;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.RingSet;

/** What to build: the parts in large type, a broken limit, stack order and ramps as drawings. */
final class BuildSection {
  private final SetupSheet sheet;
  private final double scale;
  private final Markup page = new Markup();

  /** Makes the section; drawings are as large as they were drawn times a scale. */
  BuildSection(SetupSheet sheet, double scale) {
    this.sheet = sheet;
    this.scale = scale;
  }

  String html() {
    tiles();
    broken();
    drawings();
    return page.toString();
  }

  private void tiles() {
    PlateBuild build = sheet.build();
    RingSet set = build.ringSet();
    page.raw("<table class='tiles'><tr>");
    tile("Ring set", SheetHtml.name(set.name()), facing(build));
    tile(
        "Ramps as fitted",
        Shown.degrees(build.driveAngle()) + " / " + Shown.degrees(build.coastAngle()),
        "drive / coast, as stamped");
    tile(
        "Friction faces per side",
        Integer.toString(build.facesPerSide()),
        sheet.stack().plates().size() + " plates on each side, see order");
    tile(
        "Preload, whole difference",
        Shown.torque(build.preload()),
        "springs press " + Shown.number(build.preloadForce(), 0) + "\u00a0N on each pack");
    page.raw("</tr></table>");
  }

  private void broken() {
    List<String> broken = sheet.brokenLimits();
    if (!broken.isEmpty()) {
      page.raw("<p class='broken'>")
          .words("Breaks " + (broken.size() == 1 ? "a limit" : "limits") + " of the event: ")
          .words(String.join(", ", broken) + ". See the limits below before it is released.")
          .raw("</p>");
    }
  }

  private void tile(String label, String value, String note) {
    page.raw("<td>")
        .element("div", "class='label'", label)
        .element("div", "class='big'", value)
        .element("div", "class='label'", note)
        .raw("</td>");
  }

  private static String facing(PlateBuild build) {
    if (!build.ringSet().reversible()) {
      return "fits one way only";
    }
    RingSet set = build.ringSet();
    return (build.turned() ? "TURNED ROUND" : "NOT turned")
        + ", stamped "
        + Shown.degrees(set.driveAngle())
        + " / "
        + Shown.degrees(set.coastAngle());
  }

  private void drawings() {
    page.raw("<table class='cols'><tr><td class='col' style='width:123mm'>")
        .heading("Stack order, both sides alike (mirror image)")
        .raw(StackDrawing.of(sheet.stack(), scale))
        .raw("<p class='small'>")
        .element("b", "", "From the pressure ring outwards: ")
        .words(sheet.stack().order() + ". ")
        .words("C (white) turns with the case: " + count(PlateStack.Plate.CASE) + " per side. ")
        .words("G (dark) turns with the side gear: " + count(PlateStack.Plate.GEAR) + " per side. ")
        .words(
            "Plates that do no work stay in, so that the stack keeps its height. Where shim and"
                + " spring sit: maker's manual.")
        .raw("</p></td><td class='col'>")
        .heading("Ramps, seen from outside")
        .raw(RampDrawing.of(sheet.build(), scale))
        .element(
            "p",
            "class='small'",
            "Looking towards the axle; angle between flank and plane of rotation (upright here). On"
                + " power the flanks below the pin (DRIVE) push it and spread the rings, on overrun"
                + " those above it (COAST).")
        .raw("</td></tr></table>");
  }

  private int count(PlateStack.Plate kind) {
    return sheet.stack().count(kind);
  }
}
