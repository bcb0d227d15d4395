package rampwright.web.sheet;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.HtmlContainer;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.ListItem;
import com.vaadin.flow.component.html.OrderedList;
import com.vaadin.flow.component.html.UnorderedList;
import java.util.List;
import rampwright.optimiser.event.LimitedMeasure;
import rampwright.optimiser.sheet.BenchCheck.Target;
import rampwright.optimiser.sheet.SetupSheet;
import rampwright.vehicle.differential.PlateBuild;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.RingSet;
import rampwright.web.widget.Facts;
import rampwright.web.widget.LimitWords;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;

/** What stands on a sheet, on screen. */
final class SheetPreview extends Div {
  private static final long serialVersionUID = 1L;

  SheetPreview(SetupSheet sheet) {
    addClassName("rw-sections");
    add(
        new Section("Build: " + sheet.setting(), build(sheet)),
        new Section("Bench check before it goes in", bench(sheet)),
        new Section("Change from what is in the car", change(sheet)),
        new Section("Expected laps", laps(sheet)),
        new Section("Limits of the event", limits(sheet)),
        new Section("Cautions", list(new UnorderedList(), sheet.cautions())));
  }

  private static Facts build(SetupSheet sheet) {
    PlateBuild build = sheet.build();
    return new Facts()
        .with("Kit", sheet.kit())
        .with("Ring set", build.ringSet().name() + (build.turned() ? ", turned round" : ""))
        .with("Drive ramp", Shown.of(RingSet.DRIVE_ANGLE, build.driveAngle()))
        .with("Coast ramp", Shown.of(RingSet.COAST_ANGLE, build.coastAngle()))
        .with("Friction faces per side", String.valueOf(build.facesPerSide()))
        .with("Plates on each side", sheet.stack().order() + " (C: case, G: side gear)")
        .with("Preload", Shown.of(PlateDifferential.PRELOAD, build.preload()))
        .with("Spring force on each pack", Shown.of(build.preloadForce(), 0, "N"));
  }

  private static Facts bench(SetupSheet sheet) {
    return new Facts()
        .with("One wheel held, propshaft free", target(sheet.bench().wheelHeld()))
        .with("Propshaft locked, turned forwards", target(sheet.bench().lockedForwards()))
        .with("Propshaft locked, turned backwards", target(sheet.bench().lockedBackwards()));
  }

  private static String target(Target target) {
    if (!target.breaksAway()) {
      return "does not break away";
    }
    String high =
        Double.isFinite(target.high()) ? Shown.of(target.high(), 0, "N·m") : "no breakaway";
    return Shown.of(target.value(), 0, "N·m")
        + ", from "
        + Shown.of(target.low(), 0, "N·m")
        + " to "
        + high;
  }

  private static Component change(SetupSheet sheet) {
    Div change = new Div(new Facts().with("In the car now", sheet.change().from()));
    if (sheet.change().steps().isEmpty()) {
      change.add(new Div("Nothing to change."));
    } else {
      change.add(list(new OrderedList(), sheet.change().steps()));
    }
    sheet
        .change()
        .time()
        .ifPresent(time -> change.add(new Facts().with("Time", Shown.of(time / 60, 0, "min"))));
    return change;
  }

  private static Facts laps(SetupSheet sheet) {
    Facts facts = new Facts();
    for (SetupSheet.ExpectedLap lap : sheet.laps()) {
      facts.with(
          lap.circuit(),
          Shown.of(lap.lapTime(), 3, "s")
              + " (now "
              + Shown.of(lap.currentLapTime(), 3, "s")
              + ", difference "
              + Shown.signed(lap.difference(), 3, "s")
              + ")");
    }
    return facts;
  }

  private static Facts limits(SetupSheet sheet) {
    Facts facts = new Facts();
    for (SetupSheet.LimitLine line : sheet.limits()) {
      LimitedMeasure measure = line.limit().measure();
      String value =
          line.value().isPresent()
              ? LimitWords.value(measure, line.value().getAsDouble())
              : "not known";
      String met = line.met().map(LimitWords::met).orElse("");
      facts.with(
          LimitWords.of(measure), value + ", " + LimitWords.allowed(line.limit()) + "  " + met);
    }
    return facts;
  }

  private static <T extends HtmlContainer> T list(T list, List<String> lines) {
    lines.forEach(line -> list.add(new ListItem(line)));
    return list;
  }
}
