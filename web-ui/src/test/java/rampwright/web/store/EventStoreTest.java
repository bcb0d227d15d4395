package rampwright.web.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import rampwright.optimiser.event.Event;
import rampwright.vehicle.Driver;
import rampwright.vehicle.input.InvalidInput;

class EventStoreTest {
  @Test
  void aFirstStartHoldsTheSamplesAndOneOfThemIsOpen() {
    EventStore events = TestStores.inMemory("first").events();
    assertThat(events.list()).hasSizeGreaterThanOrEqualTo(3);
    assertThat(events.list()).allMatch(name -> name.sample().isPresent());
    assertThat(events.open().event().settings()).isNotEmpty();
  }

  @Test
  void aChangeOutlivesTheProgram(@TempDir Path folder) {
    String url = "jdbc:h2:file:" + folder.resolve("events");
    EventStore before = TestStores.at(url).events();
    long other = before.list().get(1).id();
    before.open(other);
    before.change(event -> EventChange.driver(event, Driver.EXPERT));
    Event changed = before.open().event();

    EventStore after = TestStores.at(url).events();
    assertThat(after.open().id()).isEqualTo(other);
    assertThat(after.open().event().driver()).isEqualTo(Driver.EXPERT);
    assertThat(after.open().event()).isEqualTo(changed);
    assertThat(after.list()).hasSameSizeAs(before.list());
  }

  @Test
  void aChangeThatBreaksARuleStoresNothing() {
    TestStores stores = TestStores.inMemory("rule");
    EventStore events = stores.events();
    Event before = events.open().event();
    assertThatExceptionOfType(InvalidInput.class)
        .isThrownBy(() -> events.change(event -> EventChange.circuits(event, List.of())))
        .withMessageContaining("at least one circuit");
    assertThat(events.open().event()).isEqualTo(before);
    assertThat(stores.events().open().event()).isEqualTo(before);
  }

  @Test
  void theSampleComesBack() {
    EventStore events = TestStores.inMemory("back").events();
    Event sample = events.open().event();
    events.change(event -> EventChange.limits(event, List.of()));
    assertThat(events.open().event()).isNotEqualTo(sample);
    assertThat(events.restoreSample().event()).isEqualTo(sample);
  }

  @Test
  void everySampleIsTheSameAfterItsWayThroughTheStore() {
    EventStore events = TestStores.inMemory("same").events();
    for (EventName name : events.list()) {
      Event event = events.open(name.id()).event();
      assertThat(EventTexts.read(EventTexts.write(event))).isEqualTo(event);
    }
  }
}
