package rampwright.web.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.jdbc.support.GeneratedKeyHolder;
import org.springframework.stereotype.Service;
import rampwright.optimiser.search.SearchProgress;
import rampwright.optimiser.search.SearchRequest;
import rampwright.optimiser.search.SearchResult;

/**
 * The search runs. What the program was doing when it ended is {@link RunState#INTERRUPTED} when it
 * starts again.
 */
@Service
public class RunStore {
  private static final int MOST_LISTED = 100;

  private final JdbcClient database;

  RunStore(JdbcClient database) {
    this.database = database;
    database
        .sql("update search_run set state = ?, ended = ? where state in (?, ?)")
        .params(
            RunState.INTERRUPTED.name(), now(), RunState.WAITING.name(), RunState.RUNNING.name())
        .update();
  }

  /** Keeps a run that waits to be started; returns its place in the store. */
  public long add(Optional<Long> eventId, SearchRequest request, String version) {
    GeneratedKeyHolder key = new GeneratedKeyHolder();
    database
        .sql(
            "insert into search_run (event_id, event_name, inputs, seed, threads, max_evaluations,"
                + " version, state, started, progress) values (?, ?, ?, ?, ?, ?, ?, ?, ?, ?)")
        .param(eventId.orElse(null))
        .param(request.event().name())
        .param(RunTexts.inputs(EventTexts.write(request.event())))
        .param(request.seed())
        .param(request.threads())
        .param(request.maxEvaluations())
        .param(version)
        .param(RunState.WAITING.name())
        .param(now())
        .param(RunTexts.progress(List.of()))
        .update(key, "id");
    return key.getKey().longValue();
  }

  /** Notes that a run has begun. */
  public void begin(long id) {
    database
        .sql("update search_run set state = ? where id = ?")
        .params(RunState.RUNNING.name(), id)
        .update();
  }

  /** Keeps how far a run is. */
  public void checkpoint(long id, List<SearchProgress> progress) {
    database
        .sql("update search_run set progress = ? where id = ?")
        .params(RunTexts.progress(progress), id)
        .update();
  }

  /** Keeps how a run ended. */
  public void end(
      long id,
      RunState state,
      List<SearchProgress> progress,
      Optional<SearchResult> result,
      String message) {
    database
        .sql(
            "update search_run set state = ?, ended = ?, progress = ?, result = ?, message = ?"
                + " where id = ?")
        .param(state.name())
        .param(now())
        .param(RunTexts.progress(progress))
        .param(result.map(RunTexts::result).orElse(null))
        .param(message)
        .param(id)
        .update();
  }

  /** Returns the last runs, the newest first. */
  public List<RunSummary> list() {
    return database
        .sql(
            "select id, event_name, seed, max_evaluations, state, started, version from search_run"
                + " order by id desc limit "
                + MOST_LISTED)
        .query(RunStore::summary)
        .list();
  }

  /** Returns a run; empty when there is none of this number. */
  public Optional<StoredRun> find(long id) {
    return database
        .sql(
            "select id, event_id, inputs, seed, threads, max_evaluations, version, state, started,"
                + " progress, result, message from search_run where id = ?")
        .param(id)
        .query(RunStore::run)
        .optional();
  }

  private static RunSummary summary(ResultSet row, int number) throws SQLException {
    return new RunSummary(
        row.getLong("id"),
        row.getString("event_name"),
        row.getLong("seed"),
        row.getInt("max_evaluations"),
        RunState.valueOf(row.getString("state")),
        row.getObject("started", OffsetDateTime.class),
        row.getString("version"));
  }

  private static StoredRun run(ResultSet row, int number) throws SQLException {
    SearchRequest request =
        new SearchRequest(
            EventTexts.read(RunTexts.inputs(row.getString("inputs"))),
            row.getLong("seed"),
            row.getInt("threads"),
            row.getInt("max_evaluations"));
    long eventId = row.getLong("event_id");
    Optional<Long> event = row.wasNull() ? Optional.empty() : Optional.of(eventId);
    return new StoredRun(
        row.getLong("id"),
        event,
        request,
        row.getString("version"),
        RunState.valueOf(row.getString("state")),
        row.getObject("started", OffsetDateTime.class),
        RunTexts.progress(row.getString("progress")),
        Optional.ofNullable(row.getString("result")).map(RunTexts::result),
        Optional.ofNullable(row.getString("message")).orElse(""));
  }

  private static OffsetDateTime now() {
    return OffsetDateTime.now(ZoneOffset.UTC);
  }
}
