package plusward.exchange;

import org.springframework.boot.diagnostics.AbstractFailureAnalyzer;
import org.springframework.boot.diagnostics.FailureAnalysis;

/** Prints what is wrong with the seed data, and what to do, in place of a stack trace. */
class DemonstrationFailure extends AbstractFailureAnalyzer<DemonstrationClinic.Refused> {

    @Override
    protected FailureAnalysis analyze(Throwable failure, DemonstrationClinic.Refused refused) {
        return new FailureAnalysis(String.valueOf(refused.getMessage()), refused.action(), failure);
    }
}
