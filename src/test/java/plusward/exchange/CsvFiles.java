package plusward.exchange;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.springframework.core.io.ClassPathResource;

/** CsvFiles for tests. */
final class CsvFiles {

    private CsvFiles() {}

    /** The demonstration clinic: 29 children, 231 visits. */
    static CsvPair seed() {
        return pair(seed("children.csv"), seed("visits.csv"));
    }

    static String seed(String name) {
        try {
            return new ClassPathResource("seed-data/" + name).getContentAsString(StandardCharsets.UTF_8);
        } catch (IOException absent) {
            throw new UncheckedIOException(absent);
        }
    }

    static CsvPair pair(@Nullable String children, @Nullable String visits) {
        return new CsvPair(bytes(children), bytes(visits));
    }

    static byte @Nullable [] bytes(@Nullable String text) {
        return text == null ? null : text.getBytes(StandardCharsets.UTF_8);
    }

    /** Children with ten visits each. */
    static CsvPair many(int visits) {
        StringBuilder children = new StringBuilder("clinic_number,given_name,birth_date\n");
        StringBuilder rows = new StringBuilder("clinic_number,visit_date,wear_hours,worn_right,worn_left,worn_add,"
                + "cycloplegic_right,cycloplegic_left,turn_cc_distance,turn_cc_near,acuity_right,acuity_left,note\n");
        for (int i = 0; i < visits; i++) {
            if (i % 10 == 0) {
                children.append("B-").append(i / 10).append(",Child,2015-01-31\n");
            }
            rows.append("B-")
                    .append(i / 10)
                    .append(',')
                    .append(LocalDate.of(2018, 1, 1).plusDays(i % 10 * 90L));
            rows.append(",12,+3.50 -0.50 x 180,+3.25,2.50,+4.00,+4.25,E(T) 8,ET' 14,20/25,20/30-2,as before\n");
        }
        return pair(children.toString(), rows.toString());
    }
}
