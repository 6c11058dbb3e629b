package plusward.readback;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.Period;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import plusward.course.Limits;
import plusward.course.SegmentPlace;
import plusward.course.Visit;
import plusward.exam.Examination;
import plusward.exam.ExaminationReader;
import plusward.exam.ExaminationWriter;
import plusward.exam.Eye;
import plusward.exam.Field;
import plusward.exam.Gaze;
import plusward.exam.LensMeasure;
import plusward.exam.Reason;
import plusward.exam.TurnCondition;
import plusward.optics.Millimetres;

/** Says of each field of a visit what was understood. */
final class FieldReader {

    private static final Pattern NUMBER = Pattern.compile("[+-]?\\d{1,9}(\\.\\d{1,9})?");

    private final Visit visit;
    private final Map<Field, String> canonical;

    FieldReader(Visit visit) {
        this.visit = visit;
        this.canonical = ExaminationWriter.write(visit.exam());
    }

    /** Empty when nothing stands there, or it could not be read. */
    List<Reason> read(Field field, String typed) {
        String text = canonical.get(field);
        if (text == null || typed.isBlank()) {
            return List.of();
        }
        List<Reason> understood = new ArrayList<>();
        if (!isAsTyped(text, typed)) {
            understood.add(Reason.of("readback.written", text));
        }
        meaning(field).forEach(understood::add);
        return understood;
    }

    /** Case, a plus sign and zeros at the end of a number say nothing new. */
    private static boolean isAsTyped(String text, String typed) {
        String entered = typed.strip();
        boolean numbers =
                NUMBER.matcher(text).matches() && NUMBER.matcher(entered).matches();
        return text.equalsIgnoreCase(entered)
                || (numbers && new BigDecimal(text).compareTo(new BigDecimal(entered)) == 0);
    }

    private Stream<Reason> meaning(Field field) {
        Optional<LensMeasure> lens = LensMeasure.of(field);
        if (lens.isPresent()) {
            return LensReads.of(visit, lens.get(), lens.get().eye(field));
        }
        Optional<TurnCondition> turn = Stream.of(TurnCondition.values())
                .filter(condition -> ExaminationReader.fieldOf(condition) == field)
                .findFirst();
        return turn.isPresent() ? TurnReads.of(visit, turn.get()) : Stream.concat(inGaze(field), other(field).stream());
    }

    private Stream<Reason> inGaze(Field field) {
        return Stream.of(Gaze.values())
                .filter(gaze -> ExaminationReader.fieldOf(gaze) == field)
                .flatMap(gaze -> Optional.ofNullable(visit.exam().motility().at(gaze)).stream())
                .flatMap(TurnReads::understood);
    }

    private Optional<Reason> other(Field field) {
        Examination exam = exam();
        return switch (field) {
            case VISIT_DATE -> Optional.of(age(visit.patient().bornOn(), exam.date()));
            case WORN_SINCE -> Optional.ofNullable(exam.glasses().since()).map(this::weeksBefore);
            case NEXT_VISIT_WEEKS -> Optional.ofNullable(exam.nextVisit()).map(day -> Reason.of("readback.next", day));
            case ACUITY_RIGHT ->
                AcuityReads.of(visit, each -> each.acuities().each().right());
            case ACUITY_LEFT ->
                AcuityReads.of(visit, each -> each.acuities().each().left());
            case ACUITY_BOTH -> AcuityReads.of(visit, each -> each.acuities().both());
            case ACUITY_SC_RIGHT ->
                AcuityReads.of(visit, each -> each.acuitiesUncorrected().each().right());
            case ACUITY_SC_LEFT ->
                AcuityReads.of(visit, each -> each.acuitiesUncorrected().each().left());
            case ACUITY_SC_BOTH ->
                AcuityReads.of(visit, each -> each.acuitiesUncorrected().both());
            case SEGMENT_RIGHT_MM -> segment(Eye.RIGHT);
            case SEGMENT_LEFT_MM -> segment(Eye.LEFT);
            case PUPIL_HEIGHT_RIGHT_MM -> top(Eye.RIGHT);
            case PUPIL_HEIGHT_LEFT_MM -> top(Eye.LEFT);
            default -> Optional.empty();
        };
    }

    private static Reason age(LocalDate born, LocalDate on) {
        if (on.isBefore(born)) {
            return Reason.of("readback.age.before-birth", born);
        }
        Period age = Period.between(born, on);
        return age.getYears() == 0
                ? Reason.of("readback.age.months", age.getMonths())
                : Reason.of("readback.age", age.getYears(), age.getMonths());
    }

    private Reason weeksBefore(LocalDate since) {
        if (since.isAfter(visit.date())) {
            return Reason.of("readback.worn.after");
        }
        return Reason.of("readback.worn", Math.toIntExact(ChronoUnit.WEEKS.between(since, visit.date())));
    }

    /** Against the pupil's lower edge when an add is worn, else against its centre. */
    private Optional<Reason> segment(Eye eye) {
        return SegmentPlace.at(visit, Limits.DEFAULT)
                .flatMap(place -> Optional.ofNullable(place.belowEdge().of(eye)))
                .map(below -> Reason.of(below(below), below.unsigned()));
    }

    /** Where two heights over the lens put the line, over the pupil centre. */
    private Optional<Reason> top(Eye eye) {
        return Optional.ofNullable(exam().segment().top().of(eye)).map(top -> Reason.of("readback.segment.top", top));
    }

    private Examination exam() {
        return visit.exam();
    }

    private static String below(Millimetres belowEdge) {
        return belowEdge.amount() == 0
                ? "readback.segment.at-edge"
                : belowEdge.amount() > 0 ? "readback.segment.below-edge" : "readback.segment.above-edge";
    }
}
