package rampwright.web.sheet;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Anchor;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.select.Select;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.BeforeEnterObserver;
import com.vaadin.flow.router.Menu;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;
import com.vaadin.flow.server.streams.DownloadHandler;
import com.vaadin.flow.server.streams.DownloadResponse;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.NamedSetting;
import rampwright.optimiser.sheet.SetupSheet;
import rampwright.optimiser.sheet.SetupSheets;
import rampwright.optimiser.sheet.SheetPdf;
import rampwright.web.store.EventStore;
import rampwright.web.widget.Choice;
import rampwright.web.widget.Later;
import rampwright.web.widget.Notice;
import rampwright.web.widget.SettingWords;
import rampwright.web.work.Desk;

/** The setup sheet of one setting: what stands on it, and the sheet itself to print. */
@Route("sheet")
@PageTitle("Sheet · Rampwright")
@Menu(title = "Sheet", order = 6)
class SheetView extends Div implements BeforeEnterObserver {
  private static final long serialVersionUID = 1L;
  private static final String SETTING = "setting";

  private final transient Event event;
  private final Later result;

  /** A sheet and its printed form. */
  private static final class Printed {
    private final SetupSheet sheet;
    private final byte[] pdf;

    private Printed(SetupSheet sheet, byte[] pdf) {
      this.sheet = sheet;
      this.pdf = pdf;
    }
  }

  SheetView(EventStore events, Desk desk) {
    this.event = events.open().event();
    this.result = new Later(desk);
    addClassName("rw-view");
  }

  @Override
  public void beforeEnter(BeforeEnterEvent enter) {
    removeAll();
    Div head = new Div(new H1("Sheet"));
    head.addClassName("rw-head");
    add(head);
    List<NamedSetting> buildable =
        event.settings().stream().filter(setting -> setting.kitSetting().isPresent()).toList();
    if (buildable.isEmpty()) {
      add(
          Notice.empty(
              "No setting of this event can be built from the kit, so there is nothing to hand"
                  + " over. Add one on the Event page or from a search."));
      return;
    }
    String wanted =
        enter
            .getLocation()
            .getQueryParameters()
            .getSingleParameter(SETTING)
            .orElse(event.currentSetting());
    NamedSetting first =
        buildable.stream()
            .filter(setting -> setting.name().equals(wanted))
            .findFirst()
            .orElse(buildable.get(0));
    Select<NamedSetting> choice = select(buildable, first);
    head.add(choice);
    add(result);
    show(choice.getValue());
  }

  private Select<NamedSetting> select(List<NamedSetting> buildable, NamedSetting first) {
    Select<NamedSetting> select =
        Choice.of(
            "Setting to be built",
            buildable,
            first,
            setting -> setting.name() + ": " + SettingWords.parts(setting),
            () -> {});
    select.addClassName("rw-choice-wide");
    select.addValueChangeListener(change -> show(change.getValue()));
    return select;
  }

  private void show(NamedSetting setting) {
    result.show(
        "Computing the laps of the sheet and setting it",
        progress -> printed(setting),
        printed -> draw(setting, printed));
  }

  private Printed printed(NamedSetting setting) {
    SetupSheet sheet = SetupSheets.of(event, setting);
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      SheetPdf.write(sheet, out);
    } catch (IOException e) {
      throw new UncheckedIOException("The sheet could not be set", e);
    }
    return new Printed(sheet, out.toByteArray());
  }

  private Component draw(NamedSetting setting, Printed printed) {
    String file = "setup-" + setting.name().replaceAll("[^\\p{Alnum}]+", "-") + ".pdf";
    DownloadHandler handler =
        DownloadHandler.fromInputStream(
            download ->
                new DownloadResponse(
                    new ByteArrayInputStream(printed.pdf),
                    file,
                    "application/pdf",
                    printed.pdf.length));
    Anchor link = new Anchor(handler, "Download the sheet (PDF, A4)");
    link.addClassName("rw-button");
    return new Div(link, new SheetPreview(printed.sheet));
  }
}
