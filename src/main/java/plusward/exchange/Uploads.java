package plusward.exchange;

import java.sql.Types;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.Optional;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.stereotype.Repository;
import org.springframework.transaction.annotation.Transactional;

/** The files that an account is looking at before they are brought in: one pair an account, kept on the server. */
@Repository
class Uploads {

    private final JdbcClient database;
    private final Clock clock;

    Uploads(JdbcClient database, Clock clock) {
        this.database = database;
        this.clock = clock;
    }

    /** Keeps the pair in place of the one before. */
    @Transactional
    public void keep(String account, CsvPair files) {
        forget(account);
        database.sql(
                        "insert into import_upload (account, uploaded_at, children, visits) values (:account, :at, :children, :visits)")
                .param("account", account)
                .param("at", clock.instant().atOffset(ZoneOffset.UTC))
                .param("children", files.bytesOf(CsvKind.CHILDREN), Types.VARBINARY)
                .param("visits", files.bytesOf(CsvKind.VISITS), Types.VARBINARY)
                .update();
    }

    @Transactional(readOnly = true)
    public Optional<CsvPair> of(String account) {
        return database.sql("select children, visits from import_upload where account = ?")
                .param(account)
                .query((row, number) -> new CsvPair(row.getBytes("children"), row.getBytes("visits")))
                .optional();
    }

    @Transactional
    public void forget(String account) {
        database.sql("delete from import_upload where account = ?")
                .param(account)
                .update();
    }
}
