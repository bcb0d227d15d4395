package rampwright.vehicle.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

class YamlReaderTest {
  private static final Quantity MASS = Quantity.si("mass_kg", "mass", "kg", 50, 20000, "");
  private static final Quantity ANGLE = Quantity.degrees("angle_deg", "angle", 0, 90, "");
  private static final Quantity FACES = Quantity.si("faces", "faces", "", 1, 60, "");

  private static YamlMap parse(String text) {
    return YamlReader.parse("f.yaml", text).map(List.of("group", "mass_kg", "angle_deg", "faces"));
  }

  private static void assertMessage(ThrowingCallable call, String message) {
    assertThatExceptionOfType(InvalidInput.class).isThrownBy(call).withMessage(message);
  }

  @Test
  void readsNumbersInSiUnits() {
    YamlMap map = parse("# a comment\nmass_kg: 1.18e3 # behind\nangle_deg: 45\nfaces: 8\n");
    assertThat(map.number(MASS)).isEqualTo(1180);
    assertThat(map.number(ANGLE)).isEqualTo(Math.PI / 4);
    assertThat(map.get("faces").wholeNumber(FACES)).isEqualTo(8);
  }

  @Test
  void anotherValueStandsInForAMissingKeyOnlyWhereOneIsAllowed() {
    YamlMap map = parse("faces: 8\n");
    assertThat(map.number(MASS, 7)).isEqualTo(7);
    assertMessage(
        () -> map.number(MASS),
        "f.yaml:1: The mass (missing) must be given here. Maybe a line with mass_kg was lost.");
  }

  static Stream<Arguments> faultyNumbers() {
    return Stream.of(
        arguments("mass_kg: heavy", "The mass (heavy) must be a number in kg."),
        arguments(
            "mass_kg: 1180 kg",
            "The mass (1180 kg) must be a number in kg. Maybe the unit was written behind the"
                + " number: leave it out."),
        arguments(
            "mass_kg: 1180,5",
            "The mass (1180,5) must be a number in kg. Maybe the decimal sign is a comma: use a"
                + " point."),
        arguments("mass_kg: .nan", "The mass (.nan) must be a number in kg."),
        arguments("mass_kg: .inf", "The mass (.inf) must be a number in kg."),
        arguments(
            "mass_kg: 0x10",
            "The mass (0x10) must be a number in kg. Maybe the unit was"
                + " written behind the number: leave it out."),
        arguments("mass_kg:", "The mass (nothing) must be a number in kg."),
        arguments("mass_kg: [1180]", "The mass (a list) must be a number in kg."),
        arguments("mass_kg: {a: 1}", "The mass (a group of keys) must be a number in kg."),
        arguments("mass_kg: 1e999", "The mass (Infinity kg) must be between 50 and 20000 kg."),
        arguments("mass_kg: 11.8", "The mass (11.8 kg) must be between 50 and 20000 kg."));
  }

  @ParameterizedTest
  @MethodSource("faultyNumbers")
  void aFaultyNumberIsToldWithLineAndKey(String line, String message) {
    assertMessage(() -> parse("faces: 1\n" + line).number(MASS), "f.yaml:2: mass_kg: " + message);
  }

  @Test
  void aBrokenCountIsTold() {
    assertMessage(
        () -> parse("faces: 4.5").get("faces").wholeNumber(FACES),
        "f.yaml:1: faces: The faces (4.5) must be a whole number.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"mass", "mas_kg", "Mass_kg", "mass-kg", "mass_g"})
  void anUnknownKeyIsToldWithTheOneThatWasMeant(String key) {
    assertMessage(
        () -> parse("faces: 1\n" + key + ": 1180"),
        "f.yaml:2: The key (" + key + ") must be one that is known here. Maybe you meant mass_kg.");
  }

  @Test
  void aKeyLikeNoOtherIsToldWithTheKnownOnes() {
    assertMessage(
        () -> parse("colour: red"),
        "f.yaml:1: The key (colour) must be one that is known here. Maybe use one of: group,"
            + " mass_kg, angle_deg, faces.");
  }

  @Test
  void thePathLeadsThroughGroupsAndLists() {
    YamlNode root =
        YamlReader.parse("f.yaml", "group:\n  list:\n    - mass_kg: 1\n    - mass_kg: x");
    YamlNode item = root.map(List.of("group")).get("group").map(List.of("list")).get("list");
    assertMessage(
        () -> item.items().get(1).map(List.of("mass_kg")).number(MASS),
        "f.yaml:4: group.list[2].mass_kg: The mass (x) must be a number in kg.");
  }

  static Stream<Arguments> textsThatAreNoPlainData() {
    return Stream.of(
        arguments("a: 1\nb: 2\na: 3", "f.yaml:3: The key (a) must be given once."),
        arguments("a: &x [1]\nb: *x", "f.yaml:2: b: The value (an alias) must be plain data."),
        arguments("b: *x", "f.yaml:1: b: The value (an alias) must be plain data."),
        arguments("a: !!java.io.File [x]", "f.yaml:1: a: The value (tagged !"),
        arguments("a: !odd 1", "f.yaml:1: a: The value (tagged !odd) must be plain data."),
        arguments("a: 1\n---\nb: 2", "f.yaml:3: The file (several documents) must be one document"),
        arguments("", "f.yaml:1: The file (empty) must be"),
        arguments("# only a comment\n", "f.yaml:1: The file (empty) must be"),
        arguments("a: 1\nb: [1, 2\nc: 3", "f.yaml:3: The text ("),
        arguments("a: 1\n\tb: 2", "f.yaml:2: The text ("),
        arguments("a: 1\n   b: 2", "f.yaml:2: The text ("),
        arguments("a: \u0000", "f.yaml:1: The text ("),
        arguments("[".repeat(60) + "]".repeat(60), "f.yaml:1: "));
  }

  @ParameterizedTest
  @MethodSource("textsThatAreNoPlainData")
  void whatIsNoPlainDataIsTold(String text, String start) {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> YamlReader.parse("f.yaml", text))
        .satisfies(e -> assertThat(e.getMessage()).startsWith(start).contains("must be"))
        .satisfies(e -> assertThat(e.getMessage()).doesNotContain("\n"));
  }

  @Test
  void theRootMustBeAGroup() {
    assertMessage(
        () -> YamlReader.parse("f.yaml", "just text").map(List.of("a", "b")),
        "f.yaml:1: The file (just text) must be a group of keys. Maybe use: a, b.");
  }

  @Test
  void aLargeFileIsRefusedBeforeItIsRead() {
    FileSource source = FileSource.texts(Map.of("f.yaml", "#".repeat(YamlReader.LARGEST + 1)));
    assertMessage(
        () -> YamlReader.read(source, "f.yaml"),
        "f.yaml: The size of the file (above 1000 kB) must be at most 1000 kB. Maybe this is"
            + " another kind of file.");
  }

  @Test
  void aMissingFileIsTold() {
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> YamlReader.read(FileSource.texts(Map.of()), "gone.yaml"))
        .withMessageStartingWith("The file (gone.yaml) must be a file that can be read. Maybe ");
  }

  @Test
  void relativePathsCountFromTheFolderOfTheFileThatNamesThem() {
    assertThat(FileSource.resolve("events/e.yaml", "../cars/c.yaml")).isEqualTo("cars/c.yaml");
    assertThat(FileSource.resolve("e.yaml", "cars/./c.yaml")).isEqualTo("cars/c.yaml");
    assertThat(FileSource.resolve("e.yaml", "../../c.yaml")).isEqualTo("../../c.yaml");
    assertThat(FileSource.resolve("a/e.yaml", "/b/c.yaml")).isEqualTo("/b/c.yaml");
  }
}
