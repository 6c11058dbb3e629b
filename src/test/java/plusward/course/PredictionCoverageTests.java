package plusward.course;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import plusward.course.PlusTrial.Step;
import plusward.exam.TurnCondition;
import plusward.exam.Viewing;
import plusward.optics.PrismDioptres;

/**
 * Simulated children who change in nothing but their glasses, with noise as published repeatability has it: how often a
 * further measurement lies inside the predicted interval.
 */
class PredictionCoverageTests {

    private static final int MEASUREMENTS = 10_000;
    private static final double HYPEROPIA = 4;

    /** The truth of one child. */
    private record Truth(double base, double perDioptre, double nearExtra) {

        double distance(double plus) {
            return base + perDioptre * Math.max(0, HYPEROPIA - plus);
        }

        double near(double plus, double add) {
            return base + nearExtra + perDioptre * Math.max(0, HYPEROPIA - plus + 3 - add);
        }
    }

    @Test
    void theIntervalHolds93To97OfAHundredFurtherMeasurements() {
        Random random = new Random(20261201);
        int inside = 0;
        for (int i = 0; i < MEASUREMENTS; i++) {
            Truth truth = new Truth(
                    11 + 4 * random.nextDouble(), 1.5 + 1.5 * random.nextDouble(), 3 * random.nextDouble() - 1.5);
            Visit visit = CourseText.visit(
                    "cycloplegic_right=+4.00",
                    "worn_right=+3.50",
                    "worn_add=2.50",
                    "turn_sc_distance=" + measured(truth.distance(0), Viewing.DISTANCE, random),
                    "turn_cc_distance=" + measured(truth.distance(3.5), Viewing.DISTANCE, random),
                    "turn_cc_near=" + measured(truth.near(3.5, 0), Viewing.NEAR, random),
                    "turn_add_near=" + measured(truth.near(3.5, 2.5), Viewing.NEAR, random));
            PlusTrial trial = PlusTrial.at(visit);
            if (trial.steps().isEmpty()) {
                i--;
                continue;
            }
            Step step = trial.steps().get(random.nextInt(trial.steps().size() - 1));
            inside += isInside(step, truth, 3.5 + step.change().amount(), random) ? 1 : 0;
        }
        assertThat(inside / (double) MEASUREMENTS).isBetween(0.93, 0.97);
    }

    private static boolean isInside(Step step, Truth truth, double plus, Random random) {
        TurnCondition condition =
                step.turns().get(random.nextInt(step.turns().size())).condition();
        double turn = switch (condition) {
            case CC_DISTANCE -> truth.distance(plus);
            case CC_NEAR -> truth.near(plus, 0);
            default -> truth.near(plus, 2.5);
        };
        double again = turn + noise(turn, condition.viewing(), random);
        Estimate<PrismDioptres> predicted = step.at(condition).orElseThrow().turn();
        return again >= predicted.low().amount() && again <= predicted.high().amount();
    }

    private static String measured(double turn, Viewing viewing, Random random) {
        return String.format(Locale.ROOT, "ET %.1f", Math.max(0.1, turn + noise(turn, viewing, random)));
    }

    private static double noise(double turn, Viewing viewing, Random random) {
        return random.nextGaussian()
                * Repeatability.standardDeviation(PrismDioptres.of(turn), viewing)
                        .amount();
    }
}
