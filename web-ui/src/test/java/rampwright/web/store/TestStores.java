package rampwright.web.store;

import javax.sql.DataSource;
import org.flywaydb.core.Flyway;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.jdbc.datasource.DataSourceTransactionManager;
import org.springframework.jdbc.datasource.DriverManagerDataSource;
import org.springframework.transaction.support.TransactionTemplate;

/** The stores on a database of their own, as the program makes them. */
public final class TestStores {
  private final DataSource source;

  private TestStores(DataSource source) {
    this.source = source;
    Flyway.configure().dataSource(source).locations("classpath:db/migration").load().migrate();
  }

  /** Returns stores in memory, alone under a name. */
  public static TestStores inMemory(String name) {
    return at("jdbc:h2:mem:" + name + ";DB_CLOSE_DELAY=-1");
  }

  /** Returns stores at a database address. */
  public static TestStores at(String url) {
    return new TestStores(new DriverManagerDataSource(url, "rampwright", ""));
  }

  /** Returns the events, as after a start of the program. */
  public EventStore events() {
    return new EventStore(
        JdbcClient.create(source),
        new TransactionTemplate(new DataSourceTransactionManager(source)));
  }

  /** Returns the search runs, as after a start of the program. */
  public RunStore runs() {
    return new RunStore(JdbcClient.create(source));
  }
}
