package rampwright.web.store;

import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.jdbc.support.GeneratedKeyHolder;
import org.springframework.stereotype.Service;
import org.springframework.transaction.support.TransactionTemplate;
import rampwright.optimiser.event.Event;
import rampwright.optimiser.event.EventFile;
import rampwright.samples.SampleFile;
import rampwright.samples.SampleFiles;
import rampwright.vehicle.file.FileSource;

/**
 * The events, and which of them is open. At the first start it holds a copy of every sample event,
 * the first of them open. A change is stored as a whole or not at all.
 */
@Service
public class EventStore {
  private static final String SAMPLE_KIND = "event";

  private final JdbcClient database;
  private final TransactionTemplate whole;
  private StoredEvent open;

  EventStore(JdbcClient database, TransactionTemplate whole) {
    this.database = database;
    this.whole = whole;
    whole.executeWithoutResult(status -> addMissingSamples());
  }

  /** Returns all events by name. */
  public List<EventName> list() {
    return database
        .sql("select id, name, sample from event order by name, id")
        .query(
            (row, i) ->
                new EventName(
                    row.getLong(1), row.getString(2), Optional.ofNullable(row.getString(3))))
        .list();
  }

  /** Returns the open event. */
  public synchronized StoredEvent open() {
    if (open == null) {
      open = read(openId());
    }
    return open;
  }

  /** Opens another event. */
  public synchronized StoredEvent open(long id) {
    StoredEvent wanted = read(id);
    whole.executeWithoutResult(
        status -> {
          database.sql("update event set opened = false where opened").update();
          database.sql("update event set opened = true where id = ?").param(id).update();
        });
    open = wanted;
    return open;
  }

  /**
   * Changes the open event and stores it.
   *
   * @param change gives the new event; what it throws leaves the stored event as it was
   */
  public synchronized StoredEvent change(UnaryOperator<Event> change) {
    StoredEvent before = open();
    Event after = change.apply(before.event());
    whole.executeWithoutResult(status -> write(before.id(), after));
    open = new StoredEvent(before.id(), after);
    return open;
  }

  /** Takes the open event, if it came from a sample, back to that sample. */
  public synchronized StoredEvent restoreSample() {
    long id = open().id();
    return list().stream()
        .filter(name -> name.id() == id)
        .flatMap(name -> name.sample().stream())
        .findFirst()
        .map(path -> change(event -> sample(path)))
        .orElseGet(this::open);
  }

  private void addMissingSamples() {
    for (SampleFile file : SampleFiles.list(SAMPLE_KIND)) {
      int known =
          database
              .sql("select count(*) from event where sample = ?")
              .param(file.path())
              .query(Integer.class)
              .single();
      if (known == 0) {
        add(sample(file.path()), file.path());
      }
    }
  }

  private void add(Event event, String sample) {
    boolean first = database.sql("select count(*) from event").query(Integer.class).single() == 0;
    GeneratedKeyHolder key = new GeneratedKeyHolder();
    database
        .sql("insert into event (name, sample, opened, changed) values (?, ?, ?, ?)")
        .params(event.name(), sample, first, now())
        .update(key, "id");
    write(key.getKey().longValue(), event);
  }

  private void write(long id, Event event) {
    database
        .sql("update event set name = ?, changed = ? where id = ?")
        .params(event.name(), now(), id)
        .update();
    database.sql("delete from event_file where event_id = ?").param(id).update();
    EventTexts.write(event)
        .forEach(
            (path, content) ->
                database
                    .sql("insert into event_file (event_id, path, content) values (?, ?, ?)")
                    .params(id, path, content)
                    .update());
  }

  private StoredEvent read(long id) {
    Map<String, String> texts =
        database
            .sql("select path, content from event_file where event_id = ?")
            .param(id)
            .query((row, i) -> Map.entry(row.getString(1), row.getString(2)))
            .list()
            .stream()
            .collect(Collectors.toMap(Map.Entry::getKey, Map.Entry::getValue));
    return new StoredEvent(id, EventTexts.read(texts));
  }

  private long openId() {
    return database.sql("select id from event where opened").query(Long.class).single();
  }

  private static Event sample(String path) {
    FileSource samples = FileSource.classPath(SampleFiles.class.getClassLoader(), SampleFiles.BASE);
    return EventFile.read(samples, path);
  }

  private static OffsetDateTime now() {
    return OffsetDateTime.now(ZoneOffset.UTC);
  }
}
