package rampwright.samples;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

class SampleFilesTest {
  @Test
  void theIndexNamesEveryFileOnce() throws IOException, URISyntaxException {
    Path index =
        Path.of(SampleFiles.class.getResource("/" + SampleFiles.BASE + "index.csv").toURI());
    Path base = index.getParent();
    List<String> files;
    try (Stream<Path> walk = Files.walk(base)) {
      files =
          walk.filter(Files::isRegularFile)
              .map(file -> base.relativize(file).toString().replace('\\', '/'))
              .filter(path -> !path.startsWith(SampleFiles.FAILURES))
              .filter(path -> !path.equals("index.csv"))
              .filter(path -> !path.endsWith(".md") && !path.endsWith(".class"))
              .toList();
    }
    assertThat(SampleFiles.list())
        .extracting(SampleFile::path)
        .containsExactlyInAnyOrderElementsOf(files);
  }

  @Test
  void theIndexOfBadInputsNamesEveryFileOnce() throws IOException, URISyntaxException {
    Path index =
        Path.of(
            SampleFiles.class
                .getResource("/" + SampleFiles.BASE + SampleFiles.FAILURES + "index.csv")
                .toURI());
    List<String> files;
    try (Stream<Path> list = Files.list(index.getParent())) {
      files =
          list.filter(Files::isRegularFile)
              .map(file -> SampleFiles.FAILURES + file.getFileName())
              .filter(path -> !path.endsWith("/index.csv"))
              .toList();
    }
    assertThat(SampleFiles.badInputs())
        .extracting(BadInput::path)
        .containsExactlyInAnyOrderElementsOf(files)
        .hasSizeGreaterThan(12);
  }

  @Test
  void aSampleOpens() throws IOException {
    assertThat(SampleFiles.list("circuit")).hasSizeGreaterThanOrEqualTo(2);
    for (SampleFile sample : SampleFiles.list()) {
      try (InputStream in = SampleFiles.open(sample.path())) {
        assertThat(in.read()).isPositive();
      }
      assertThat(sample.title()).isNotBlank();
    }
  }

  @Test
  void aFileThatIsNotThereIsToldByName() {
    assertThatThrownBy(() -> SampleFiles.open("circuits/lost.csv"))
        .isInstanceOf(FileNotFoundException.class)
        .hasMessage("circuits/lost.csv");
  }
}
