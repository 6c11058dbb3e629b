package plusward.exchange;

import java.time.Clock;
import java.time.LocalDate;
import java.util.Optional;
import org.springframework.stereotype.Service;
import org.springframework.transaction.annotation.Transactional;
import plusward.exchange.Outcome.Counts;

/** Brings a file pair in, all or nothing. What is stored was judged in the same transaction. */
@Service
class Imports {

    private final ClinicRecords clinic;
    private final Clock clock;

    Imports(ClinicRecords clinic, Clock clock) {
        this.clinic = clinic;
        this.clock = clock;
    }

    /** What bringing the files in would do. */
    @Transactional(readOnly = true)
    public Plan look(CsvPair files) {
        Judge judge = new Judge(files);
        return judge.judge(clinic.of(judge.mentioned()), LocalDate.now(clock));
    }

    /** Stores the files unless something in them is refused. */
    @Transactional
    public Plan bringIn(CsvPair files) {
        Plan plan = look(files);
        if (!plan.isRefused()) {
            clinic.store(plan);
        }
        return plan;
    }

    /** Stores the files only when that does what was looked at; absent when it no longer would, and nothing is stored. */
    @Transactional
    public Optional<Counts> bringInAsSeen(CsvPair files, String fingerprint) {
        Plan plan = look(files);
        if (plan.isRefused() || !plan.fingerprint().equals(fingerprint)) {
            return Optional.empty();
        }
        clinic.store(plan);
        return Optional.of(plan.counts());
    }
}
