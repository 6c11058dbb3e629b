package plusward.draft;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Timestamp;
import java.time.Clock;
import java.time.LocalDate;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.springframework.dao.DuplicateKeyException;
import org.springframework.data.domain.AuditorAware;
import org.springframework.jdbc.core.simple.JdbcClient;
import org.springframework.stereotype.Service;
import plusward.exam.Field;
import tools.jackson.core.type.TypeReference;
import tools.jackson.databind.json.JsonMapper;

/** The drafts of the signed-in account: the door of this feature. Nobody sees the draft of another account. */
@Service
public class Drafts {

    /** Longer than any visit that can be stored; more than this is not kept, so that a paste cannot fill the disk. */
    static final int LONGEST = 20_000;

    private static final String ONE =
            " where account = :account and child_id = :child and visit_id = :visit" + " and begun_for = :day";
    /** The reason for a correction, which is no field. */
    private static final String WHY = "why";

    private static final TypeReference<Map<String, String>> TEXT = new TypeReference<>() {};

    private final JdbcClient database;
    private final AuditorAware<String> account;
    private final JsonMapper json;
    private final Clock clock;

    Drafts(JdbcClient database, AuditorAware<String> account, JsonMapper json, Clock clock) {
        this.database = database;
        this.account = account;
        this.json = json;
        this.clock = clock;
    }

    /** Keeps what is typed in place of what was kept before; false when it is too long to keep. */
    public boolean keep(Draft.Place place, int version, String why, Map<Field, String> typed) {
        String text = json.writeValueAsString(texts(why, typed));
        if (text.length() > LONGEST) {
            return false;
        }
        if (!update(place, version, text)) {
            insert(place, version, text);
        }
        return true;
    }

    /** The reason stands among the fields: as JSON, any length and any character of it can be stored. */
    private static Map<String, String> texts(String why, Map<Field, String> typed) {
        Map<String, String> texts = typed.entrySet().stream()
                .filter(each -> !each.getValue().isBlank())
                .collect(Collectors.toMap(each -> each.getKey().column(), Map.Entry::getValue));
        texts.put(WHY, why);
        return texts;
    }

    private boolean update(Draft.Place place, int version, String text) {
        return at(place, "update draft set version = :version, typed = :typed, kept_at = :now" + ONE)
                        .param("version", version)
                        .param("typed", text)
                        .param("now", Timestamp.from(clock.instant()))
                        .update()
                > 0;
    }

    /** Two windows may keep their first text at once: the later one then updates. */
    private void insert(Draft.Place place, int version, String text) {
        try {
            at(
                            place,
                            "insert into draft (account, child_id, visit_id, begun_for, version, typed, kept_at)"
                                    + " values (:account, :child, :visit, :day, :version, :typed, :now)")
                    .param("version", version)
                    .param("typed", text)
                    .param("now", Timestamp.from(clock.instant()))
                    .update();
        } catch (DuplicateKeyException keptMeanwhile) {
            update(place, version, text);
        }
    }

    public Optional<Draft> find(Draft.Place place) {
        return at(place, "select * from draft" + ONE).query(this::draft).optional();
    }

    /** The account's drafts, the latest kept first. */
    public List<Draft> mine() {
        return database.sql("select * from draft where account = :account order by kept_at desc, child_id, visit_id")
                .param("account", account())
                .query(this::draft)
                .list();
    }

    /** Forgets a draft, because it was saved or is not wanted. */
    public void forget(Draft.Place place) {
        at(place, "delete from draft" + ONE).update();
    }

    private JdbcClient.StatementSpec at(Draft.Place place, String statement) {
        return database.sql(statement)
                .param("account", account())
                .param("child", place.childId())
                .param("visit", place.visitId())
                .param("day", place.begunFor());
    }

    private Draft draft(ResultSet row, int number) throws SQLException {
        Map<Field, String> typed = new EnumMap<>(Field.class);
        Map<String, String> texts = json.readValue(row.getString("typed"), TEXT);
        texts.forEach((column, text) -> Field.named(column).ifPresent(field -> typed.put(field, text)));
        Draft.Place place = new Draft.Place(
                row.getLong("child_id"), row.getLong("visit_id"), row.getObject("begun_for", LocalDate.class));
        return new Draft(
                place,
                row.getInt("version"),
                texts.getOrDefault(WHY, ""),
                typed,
                row.getTimestamp("kept_at").toInstant());
    }

    private String account() {
        return account.getCurrentAuditor().orElse("");
    }
}
