package rampwright.web.event;

import com.vaadin.flow.component.grid.Grid;
import java.util.stream.Collectors;
import rampwright.optimiser.kit.PartsKit;
import rampwright.vehicle.differential.PlateDifferential;
import rampwright.vehicle.differential.PlateHardware;
import rampwright.vehicle.differential.RingSet;
import rampwright.web.widget.Facts;
import rampwright.web.widget.Section;
import rampwright.web.widget.Shown;
import rampwright.web.widget.Tables;

/** What lies in the drawer. */
final class KitPanel extends Section {
  private static final long serialVersionUID = 1L;

  KitPanel(PartsKit kit) {
    super("Parts kit: " + kit.name());
    PlateHardware hardware = kit.hardware();
    PartsKit.ChangeTimes times = kit.changeTimes();
    Grid<RingSet> rings = Tables.dense();
    rings.addColumn(RingSet::name).setHeader("Ring set");
    Tables.number(
        rings, "Drive ramp (°)", set -> Shown.bare(RingSet.DRIVE_ANGLE, set.driveAngle()));
    Tables.number(
        rings, "Coast ramp (°)", set -> Shown.bare(RingSet.COAST_ANGLE, set.coastAngle()));
    rings.addColumn(set -> set.reversible() ? "yes" : "no").setHeader("Can be turned");
    rings.setItems(kit.ringSets());
    rings.setAllRowsVisible(true);
    add(
        new Facts()
            .with("Friction faces per side", faces(kit))
            .with("Preload", preload(kit.preload()))
            .with("Plate friction", Shown.bare(hardware.plateFriction(), 2))
            .with("Plate radii", radii(hardware))
            .with("Ramp radius", Shown.of(PlateHardware.RAMP_RADIUS, hardware.rampRadius()))
            .with("Ramp friction", Shown.bare(hardware.rampFriction(), 2))
            .with("Change of preload", Shown.of(PartsKit.ChangeTimes.PRELOAD, times.preload()))
            .with("Change of plates", Shown.of(PartsKit.ChangeTimes.FACES, times.faces()))
            .with("Change of ring set", Shown.of(PartsKit.ChangeTimes.RING_SET, times.ringSet())),
        rings);
  }

  private static String faces(PartsKit kit) {
    return kit.facesPerSide().stream().map(String::valueOf).collect(Collectors.joining(", "));
  }

  private static String preload(PartsKit.PreloadRange range) {
    return Shown.bare(PlateDifferential.PRELOAD, range.min())
        + " to "
        + Shown.of(PlateDifferential.PRELOAD, range.max())
        + " in steps of "
        + Shown.of(PlateDifferential.PRELOAD, range.step());
  }

  private static String radii(PlateHardware hardware) {
    return Shown.bare(PlateHardware.INNER_RADIUS, hardware.plateInnerRadius())
        + " to "
        + Shown.of(PlateHardware.OUTER_RADIUS, hardware.plateOuterRadius());
  }
}
