package rampwright.web.event;

import com.vaadin.flow.component.button.Button;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.select.Select;
import com.vaadin.flow.component.upload.Upload;
import com.vaadin.flow.router.PageTitle;
import com.vaadin.flow.router.Route;
import com.vaadin.flow.router.RouterLink;
import com.vaadin.flow.server.streams.UploadHandler;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.stream.Stream;
import rampwright.samples.SampleFile;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.survey.CircuitImport;
import rampwright.vehicle.circuit.survey.ImportOptions;
import rampwright.vehicle.input.InvalidInput;
import rampwright.web.store.EventStore;
import rampwright.web.widget.Later;
import rampwright.web.widget.Notice;
import rampwright.web.widget.Section;
import rampwright.web.work.Desk;

/** Makes a circuit of a file and shows how, before it becomes part of the event. */
@Route("event/circuit")
@PageTitle("Circuit from a file · Rampwright")
class ImportView extends Div {
  private static final long serialVersionUID = 1L;

  /** Largest file that is taken (bytes); the reader has the same limit. */
  private static final int LARGEST = 100_000_000;

  private static final List<String> SAMPLE_KINDS = List.of("logged lap", "line", "circuit");

  private final transient EventStore events;
  private final Later result;
  private final Div answer = new Div();
  private final ImportFields fields = new ImportFields();
  private String fileName = "";
  private transient byte[] content;

  ImportView(EventStore events, Desk desk) {
    this.events = events;
    this.result = new Later(desk);
    addClassName("rw-view");
    Div head = new Div(new H1("Circuit from a file"), new RouterLink("Back", EventView.class));
    head.addClassName("rw-head");
    Button read = new Button("Read again", click -> read());
    read.setTooltipText("Reads the same file once more with these fields");
    Section file =
        new Section(
            "1 File",
            Notice.hint(
                "CSV of a logged lap (time, speed, and lateral acceleration or yaw rate;"
                    + " positions help), of stations with curvature, or a line of positions (CSV,"
                    + " GPX, GeoJSON). At most 100 MB. Nothing of the event changes before you say"
                    + " so."),
            upload(),
            samples());
    Section how = new Section("2 How it is read", fields, read, answer);
    Div steps = new Div(file, how);
    steps.addClassName("rw-sections");
    add(head, steps, result);
    result.show(Notice.empty("The circuit will be shown here before it is taken."));
  }

  private Upload upload() {
    Upload upload =
        new Upload(UploadHandler.inMemory((metadata, bytes) -> take(metadata.fileName(), bytes)));
    upload.setMaxFiles(1);
    upload.setMaxFileSize(LARGEST);
    // one file at a time, and another after it, also when the first was bad
    upload.addAllFinishedListener(event -> upload.clearFileList());
    upload.addFileRejectedListener(
        rejected ->
            result.show(
                Notice.error(
                    "The size of the file must be at most 100 MB. Maybe export one lap only, or"
                        + " fewer channels.")));
    return upload;
  }

  private Select<SampleFile> samples() {
    Select<SampleFile> select = new Select<>();
    select.setLabel("Or try a sample");
    select.addClassName("rw-choice-wide");
    select.setItemLabelGenerator(SampleFile::title);
    select.setItems(
        Stream.of(SAMPLE_KINDS)
            .flatMap(List::stream)
            .flatMap(kind -> SampleFiles.list(kind).stream())
            .toList());
    select.addValueChangeListener(change -> take(change.getValue()));
    return select;
  }

  private void take(SampleFile sample) {
    try (InputStream in = SampleFiles.open(sample.path())) {
      String path = sample.path();
      take(path.substring(path.lastIndexOf('/') + 1), in.readAllBytes());
    } catch (IOException e) {
      throw new UncheckedIOException("A sample of the program cannot be read", e);
    }
  }

  private void take(String name, byte[] bytes) {
    fileName = name;
    content = bytes;
    read();
  }

  private void read() {
    answer.removeAll();
    if (content == null) {
      answer.add(Notice.error("There is no file yet. Maybe choose one in step 1."));
      return;
    }
    try {
      ImportOptions options = fields.options();
      String name = fileName;
      byte[] bytes = content;
      result.show(
          "Reading " + name,
          progress -> CircuitImport.read(name, new ByteArrayInputStream(bytes), options),
          imported -> new ImportResult(imported, events, answer));
    } catch (InvalidInput e) {
      answer.add(Notice.error(e.getMessage()));
    }
  }
}
