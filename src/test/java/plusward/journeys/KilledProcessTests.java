package plusward.journeys;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.ServerSocket;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What the page has confirmed survives a killed process. Each round starts the whole application, logs a visit over HTTP, kills
 * the process right after the confirming page and looks for the visit after the next start. {@code -Dkill.rounds=20} makes more
 * rounds; a build makes two.
 */
class KilledProcessTests {

    private static final int ROUNDS = Integer.getInteger("kill.rounds", 2);
    private static final LocalDate FIRST_DAY = LocalDate.of(2026, 10, 1);

    @TempDir
    private Path data;

    @Test
    void aConfirmedVisitIsThereAfterKill() throws Exception {
        for (int round = 0; round < ROUNDS; round++) {
            LocalDate day = FIRST_DAY.plusDays(round);
            try (RunningClinic clinic = RunningClinic.start(data, freePort())) {
                assertThat(visitsSeen(clinic)).as("before round %d", round).containsAll(days(round));
                String confirmed = clinic.logVisit("A-1001", Map.of("visit_date", day.toString(), "note", "round"));
                clinic.kill();
                assertThat(confirmed).contains(day.toString());
            }
        }
        try (RunningClinic clinic = RunningClinic.start(data, freePort())) {
            assertThat(visitsSeen(clinic)).containsAll(days(ROUNDS));
        }
    }

    private static List<String> visitsSeen(RunningClinic clinic) throws IOException, InterruptedException {
        String text = clinic.course("A-1001");
        return FIRST_DAY
                .datesUntil(FIRST_DAY.plusDays(ROUNDS))
                .map(LocalDate::toString)
                .filter(day -> text.contains("\"date\":\"" + day + "\""))
                .toList();
    }

    private static List<String> days(int rounds) {
        return FIRST_DAY
                .datesUntil(FIRST_DAY.plusDays(rounds))
                .map(LocalDate::toString)
                .toList();
    }

    private static int freePort() throws IOException {
        try (ServerSocket socket = new ServerSocket(0)) {
            return socket.getLocalPort();
        }
    }
}
