package rampwright.vehicle.circuit.survey;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.circuit.Circuit;
import rampwright.vehicle.circuit.SampleCircuits;
import rampwright.vehicle.circuit.Station;

class SampleLinesTest {
  @Test
  @Tag("regression")
  void theFilesAreThoseThatAreMadeHere() throws IOException {
    for (Map.Entry<String, String> file : SampleLines.files().entrySet()) {
      try (InputStream in = SampleFiles.open(file.getKey())) {
        assertThat(new String(in.readAllBytes(), StandardCharsets.UTF_8))
            .as(file.getKey())
            .isEqualTo(file.getValue());
      }
    }
  }

  private static ImportedCircuit imported(String path) throws IOException {
    try (InputStream in = SampleFiles.open(path)) {
      return CircuitImport.read(path, in, ImportOptions.defaults());
    }
  }

  /** Curvature and grade of a circuit against the one from which its line was made. */
  private static void agrees(ImportedCircuit imported, Circuit truth, double curvature) {
    assertThat(imported.circuit().length()).isCloseTo(truth.length(), within(1.0));
    double spacing = truth.length() / truth.stations().size();
    double stretch = truth.length() / imported.circuit().length();
    List<Station> stations = truth.stations();
    for (Station station : imported.circuit().stations()) {
      double place = station.distance() * stretch / spacing;
      Station a = stations.get((int) place % stations.size());
      Station b = stations.get(((int) place + 1) % stations.size());
      double share = place - Math.floor(place);
      double expected = a.curvature() + share * (b.curvature() - a.curvature());
      assertThat(station.curvature()).isCloseTo(expected, within(curvature));
      double grade = a.grade() + share * (b.grade() - a.grade());
      assertThat(station.grade()).isCloseTo(grade, within(0.003));
    }
  }

  @Test
  void theSurveyedLineGivesTheCircuitBack() throws IOException {
    // centimetres every 6 m: 0.005 m over a third of the smoothing length squared
    ImportedCircuit imported = imported(SampleLines.XY);
    agrees(imported, SampleCircuits.fast(), 8e-4);
    assertThat(imported.report().warnings())
        .containsExactly(
            "The points lie about 6.0 m apart: a smoothing length of 24 m or more keeps their"
                + " scatter out of the curvature.");
  }

  @Test
  void theTrackGivesCircuitAndGradeBack() throws IOException {
    ImportedCircuit imported = imported(SampleLines.GPX);
    assertThat(imported.circuit().name()).isEqualTo("Thornbeck track");
    // the hairpin has 0.045 1/m and is reached within 20 m
    agrees(imported, SampleCircuits.hilly(), 3e-3);
  }

  @Test
  void theHillyCircuitKeepsBankAndGrip() throws IOException {
    Circuit made = SampleCircuits.hilly();
    Circuit read = imported(SampleLines.HILLY).circuit();
    assertThat(read.stations()).hasSameSizeAs(made.stations());
    for (int i = 0; i < made.stations().size(); i++) {
      Station a = read.stations().get(i);
      Station b = made.stations().get(i);
      assertThat(a.grade()).isCloseTo(b.grade(), within(1e-15));
      assertThat(a.bank()).isCloseTo(b.bank(), within(1e-15));
      assertThat(a.gripLeft()).isEqualTo(b.gripLeft());
      assertThat(a.gripRight()).isEqualTo(1);
    }
    // what goes up comes down: the slopes of a lap add up to nothing
    double climb = made.stations().stream().mapToDouble(s -> Math.tan(s.grade())).sum();
    assertThat(climb).isCloseTo(0, within(1e-3));
  }
}
