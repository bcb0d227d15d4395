package rampwright.optimiser.event;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rampwright.optimiser.kit.KitFile;
import rampwright.optimiser.kit.PartsKit;
import rampwright.samples.SampleFile;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.differential.RingSet;
import rampwright.vehicle.file.CarFile;
import rampwright.vehicle.file.FileSource;
import rampwright.vehicle.file.TyreFile;

/** Every sample that the index offers is read, and events keep their content when written again. */
class SampleEventsTest {
  private static final FileSource SAMPLES =
      FileSource.classPath(SampleEventsTest.class.getClassLoader(), SampleFiles.BASE);

  static Stream<String> events() {
    return paths("event");
  }

  static Stream<String> kits() {
    return paths("kit");
  }

  static Stream<String> cars() {
    return paths("car");
  }

  static Stream<String> tyres() {
    return paths("tyre");
  }

  private static Stream<String> paths(String kind) {
    return SampleFiles.list(kind).stream().map(SampleFile::path);
  }

  @Test
  void theMainEventIsOnOffer() {
    assertThat(events()).contains(SampleFiles.MAIN_EVENT).hasSizeGreaterThanOrEqualTo(3);
  }

  @ParameterizedTest
  @MethodSource("events")
  void anEventIsReadAndWrittenUnchanged(String path) {
    Event event = EventFile.read(SAMPLES, path);
    EventFile.Names names = EventFile.names(SAMPLES, path);
    EventFile.Names fromEvents =
        new EventFile.Names(
            "../" + names.car(),
            "../" + names.kit(),
            names.circuits().stream().map(circuit -> "../" + circuit).toList());
    String text = EventFile.write(event, fromEvents);
    assertThat(EventFile.read(over(path, text), path)).isEqualTo(event);
  }

  @ParameterizedTest
  @MethodSource("events")
  void anEventHasSettingsToCompareAndOneThatTheKitBuilds(String path) {
    Event event = EventFile.read(SAMPLES, path);
    assertThat(event.settings()).hasSizeGreaterThanOrEqualTo(4);
    assertThat(event.settings()).extracting(NamedSetting::name).contains("open", "spool");
    assertThat(event.current().kitSetting()).isPresent();
    assertThat(event.limits()).isNotEmpty();
  }

  @ParameterizedTest
  @MethodSource("kits")
  void aKitHoldsEnoughToSearch(String path) {
    PartsKit kit = KitFile.read(SAMPLES, path);
    List<RingSet> turnable = kit.ringSets().stream().filter(RingSet::reversible).toList();
    assertThat(kit.ringSets()).hasSizeGreaterThanOrEqualTo(8);
    assertThat(turnable).hasSizeGreaterThanOrEqualTo(3);
    int orientations = kit.ringSets().size() + turnable.size();
    int settings = orientations * kit.facesPerSide().size() * kit.preload().count();
    assertThat(settings).isGreaterThanOrEqualTo(2000);
  }

  @ParameterizedTest
  @MethodSource("cars")
  void aCarIsRead(String path) {
    assertThat(CarFile.read(SAMPLES, path).driveline().gears()).isPositive();
  }

  @ParameterizedTest
  @MethodSource("tyres")
  void aTyreIsRead(String path) {
    assertThat(TyreFile.read(SAMPLES, path)).isNotNull();
  }

  /** Returns the samples with one text in place of a file. */
  private static FileSource over(String path, String text) {
    FileSource written = FileSource.texts(Map.of(path, text));
    return new FileSource() {
      @Override
      public InputStream open(String wanted) throws IOException {
        return wanted.equals(path) ? written.open(wanted) : SAMPLES.open(wanted);
      }
    };
  }
}
