package plusward.review;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * The course as data: the fixed format that other tools read, and from which the charts are drawn.
 *
 * <p>Numbers are in D, Δ, mm and years; what is absent is not known. The names are described in docs/interchange.md and are
 * never renamed.
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
record CourseDocument(
        String clinicNumber, LocalDate bornOn, PatternPart pattern, TrendPart trend, List<VisitPart> visits) {

    record PatternPart(String kind, List<String> because) {}

    record TrendPart(EyeTrend right, EyeTrend left, List<PublishedPart> published) {}

    /** Empty when there are fewer than three refractions over a year. */
    @JsonInclude(JsonInclude.Include.NON_NULL)
    record EyeTrend(
            @Nullable Double dioptresPerYear,
            @Nullable Double low,
            @Nullable Double high,
            @Nullable Integer n,
            @Nullable Double fittedFromAgeYears,
            @Nullable Double fittedSe,
            @Nullable Double projectedAgeYears,
            @Nullable Interval projectedSe) {

        static final EyeTrend NONE = new EyeTrend(null, null, null, null, null, null, null, null);
    }

    /** A point of the published course, which starts from this child's first refraction. */
    record PublishedPart(double ageYears, double low, double high) {}

    @JsonInclude(JsonInclude.Include.NON_NULL)
    record VisitPart(
            LocalDate date,
            double ageYears,
            ControlPart control,
            String pattern,
            DerivedPart derived,
            List<FindingPart> findings,
            List<UndecidedPart> undecided) {}

    record ControlPart(String state, String because) {}

    @JsonInclude(JsonInclude.Include.NON_NULL)
    record DerivedPart(
            @Nullable Double cycloplegicSeRight,
            @Nullable Double cycloplegicSeLeft,
            @Nullable LocalDate cycloplegicJudgedBy,
            @Nullable Double manifestSeRight,
            @Nullable Double manifestSeLeft,
            @Nullable Double wornSeRight,
            @Nullable Double wornSeLeft,
            @Nullable Double latentRight,
            @Nullable Double latentLeft,
            @Nullable Double plusShortRight,
            @Nullable Double plusShortLeft,
            Map<String, @Nullable Double> turns,
            Map<String, Double> turnsTrue,
            @Nullable RatioPart acaGradient,
            @Nullable RatioPart acaGradientTrial,
            @Nullable RatioPart acaHeterophoria,
            ModelPart accommodativeModel,
            @Nullable Double segmentBelowEdgeRight,
            @Nullable Double segmentBelowEdgeLeft,
            boolean glassesChanged) {}

    record Interval(double value, double low, double high) {}

    record RatioPart(double value, double low, double high, String from) {}

    /** A parameter that the readings cannot tell is absent; the notes say why, and what was left out. */
    @JsonInclude(JsonInclude.Include.NON_NULL)
    record ModelPart(
            @Nullable Double base,
            @Nullable Double perDioptre,
            @Nullable Double nearExtra,
            @Nullable Double baseLow,
            @Nullable Double baseHigh,
            @Nullable Double perDioptreLow,
            @Nullable Double perDioptreHigh,
            @Nullable Double nearExtraLow,
            @Nullable Double nearExtraHigh,
            int from,
            List<ReadingPart> readings,
            List<LinePoint> line,
            List<LinePoint> lineNear,
            List<String> notes) {}

    record ReadingPart(String condition, double accommodation, double turn) {}

    /** A point of a fitted line; the band is that of the line at distance, moved by what near adds. */
    record LinePoint(double accommodation, double turn, double low, double high) {}

    record FindingPart(
            String code,
            String weight,
            String text,
            List<String> checkFirst,
            Map<String, Object> evidence,
            String source) {}

    record UndecidedPart(String code, String text) {}
}
