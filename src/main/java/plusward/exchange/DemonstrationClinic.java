package plusward.exchange;

import java.io.IOException;
import java.io.UncheckedIOException;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.springframework.boot.ApplicationArguments;
import org.springframework.boot.ApplicationRunner;
import org.springframework.context.annotation.Profile;
import org.springframework.core.io.ClassPathResource;
import org.springframework.stereotype.Component;
import plusward.exam.Reason;
import plusward.web.Sentences;

/** Fills the empty demonstration clinic from {@code seed-data}, by the same import as real data. */
@Component
@Profile("demo")
class DemonstrationClinic implements ApplicationRunner {

    private static final Logger LOG = LoggerFactory.getLogger(DemonstrationClinic.class);

    private final Imports imports;
    private final ClinicRecords clinic;
    private final Sentences sentences;

    DemonstrationClinic(Imports imports, ClinicRecords clinic, Sentences sentences) {
        this.imports = imports;
        this.clinic = clinic;
        this.sentences = sentences;
    }

    /** The seed data cannot be brought in, so there is no clinic to demonstrate. */
    static final class Refused extends RuntimeException {

        private static final long serialVersionUID = 1L;

        private final String action;

        Refused(String sentence, String action) {
            super(sentence);
            this.action = action;
        }

        String action() {
            return action;
        }
    }

    @Override
    public void run(ApplicationArguments none) {
        if (clinic.isEmpty()) {
            fill(new CsvPair(seed(CsvKind.CHILDREN), seed(CsvKind.VISITS)));
        }
    }

    void fill(CsvPair files) {
        Plan plan = imports.bringIn(files);
        if (plan.isRefused()) {
            throw new Refused(
                    sentences.of(reason(plan.refusals())), sentences.of(Reason.of("exchange.demonstration.action")));
        }
        LOG.info(
                "Demonstration clinic: {} children, {} visits",
                plan.children().added().size(),
                plan.visits().added().size());
    }

    private static Reason reason(Refusals refusals) {
        Refusals.Cell first = refusals.listed().get(0);
        return Reason.of(
                "exchange.demonstration.refused",
                refusals.count(),
                first.file().fileName(),
                first.row(),
                first.column(),
                first.read(),
                first.problem(),
                first.accepted());
    }

    private static byte[] seed(CsvKind kind) {
        try {
            return new ClassPathResource("seed-data/" + kind.fileName()).getContentAsByteArray();
        } catch (IOException notPacked) {
            throw new UncheckedIOException(notPacked);
        }
    }
}
