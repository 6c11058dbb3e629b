package plusward.exam;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import plusward.optics.Dioptres;
import plusward.optics.Lens;
import plusward.optics.Millimetres;

/** The small parts of a visit: pairs, eyes, segment, drops, hours, stereoacuity, reasons. */
class ExaminationPartsTests {

    private static final Lens RIGHT = Lens.of(4, -1, 10);
    private static final Lens LEFT = Lens.of(5, 0, 180);

    @Test
    void perEyeGivesEachEyeItsOwn() {
        PerEye<Lens> eyes = new PerEye<>(RIGHT, LEFT);
        assertThat(eyes.of(Eye.RIGHT)).isEqualTo(RIGHT);
        assertThat(eyes.of(Eye.LEFT)).isEqualTo(LEFT);
        assertThat(eyes.swapped()).isEqualTo(new PerEye<>(LEFT, RIGHT));
        assertThat(eyes.measured()).containsExactly(RIGHT, LEFT);
        assertThat(PerEye.both(RIGHT)).isEqualTo(new PerEye<>(RIGHT, RIGHT));
        assertThat(Eye.RIGHT.other()).isEqualTo(Eye.LEFT);
        assertThat(Eye.LEFT.other()).isEqualTo(Eye.RIGHT);
    }

    @Test
    void aMissingEyeStaysMissing() {
        PerEye<Lens> rightOnly = new PerEye<>(RIGHT, null);
        PerEye<Lens> leftOnly = new PerEye<>(null, LEFT);
        assertThat(rightOnly.measured()).containsExactly(RIGHT);
        assertThat(leftOnly.measured()).containsExactly(LEFT);
        assertThat(rightOnly.map(Lens::sphericalEquivalent)).isEqualTo(new PerEye<>(Dioptres.of(3.5), null));
        assertThat(leftOnly.map(Lens::sphericalEquivalent)).isEqualTo(new PerEye<>(null, Dioptres.of(5)));
    }

    @Test
    void emptyIsNeitherEyeAndCompleteIsBoth() {
        assertThat(PerEye.none().isEmpty()).isTrue();
        assertThat(new PerEye<>(RIGHT, null).isEmpty()).isFalse();
        assertThat(new PerEye<>(null, LEFT).isEmpty()).isFalse();
        assertThat(PerEye.none().isComplete()).isFalse();
        assertThat(new PerEye<>(RIGHT, null).isComplete()).isFalse();
        assertThat(new PerEye<>(null, LEFT).isComplete()).isFalse();
        assertThat(PerEye.both(RIGHT).isComplete()).isTrue();
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 4.01})
    void anAddOutsideItsRangeIsRefused(double add) {
        assertThatIllegalArgumentException().isThrownBy(() -> new LensPair(PerEye.none(), Dioptres.of(add)));
    }

    @Test
    void anAddOfZeroIsNoSegment() {
        assertThat(pair(0.01).hasAdd()).isTrue();
        assertThat(pair(4).addOrZero()).isEqualTo(Dioptres.of(4));
        assertThat(pair(0).hasAdd()).isFalse();
        assertThat(LensPair.NONE.hasAdd()).isFalse();
        assertThat(LensPair.NONE.addOrZero()).isEqualTo(Dioptres.ZERO);
    }

    @Test
    void aPairIsEmptyWithoutLensesAndAdd() {
        assertThat(LensPair.NONE.isEmpty()).isTrue();
        assertThat(pair(0).isEmpty()).isFalse();
        assertThat(new LensPair(PerEye.both(RIGHT), null).isEmpty()).isFalse();
    }

    @Test
    void glassesAreWornWhenALensIsOnRecord() {
        assertThat(Glasses.NONE.areWorn()).isFalse();
        assertThat(new Glasses(pair(3), null, null).areWorn()).isFalse();
        assertThat(new Glasses(new LensPair(new PerEye<>(null, LEFT), null), null, null).areWorn())
                .isTrue();
        assertThat(new Glasses(pair(3), null, null).haveAdd()).isTrue();
        assertThat(Glasses.NONE.haveAdd()).isFalse();
    }

    @Test
    void dropsAloneAreNoRefraction() {
        assertThat(new Cycloplegic(PerEye.none(), CycloplegicAgent.ATROPINE, 2, null).isEmpty())
                .isTrue();
        assertThat(new Cycloplegic(PerEye.both(RIGHT), null, null, null).isEmpty())
                .isFalse();
    }

    @ParameterizedTest
    @CsvSource({"0, 40", "11, 40", "2, 0", "2, 1441"})
    void noOneGivesSuchDropsOrWaitsSuchATime(int drops, int minutes) {
        assertThatIllegalArgumentException().isThrownBy(() -> new Cycloplegic(PerEye.none(), null, drops, minutes));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 60.01})
    void aLensHasNoSuchHeight(double height) {
        PerEye<Millimetres> wrong = new PerEye<>(null, Millimetres.of(height));
        assertThatIllegalArgumentException().isThrownBy(() -> new SegmentHeights(wrong, PerEye.none()));
        assertThatIllegalArgumentException().isThrownBy(() -> new SegmentHeights(PerEye.none(), wrong));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            offset (mm) | line (mm) | pupil (mm) | source
            -1.56       | 18.5      | 20         | 0.06 mm apart
            -1.44       | 18.5      | 20         | 0.06 mm apart the other way
            -20         | 0         | 20.01      | just farther than 20 mm
            """)
    void aSegmentDoesNotContradictItself(double offset, double line, double pupil, String source) {
        SegmentHeights heights =
                new SegmentHeights(PerEye.both(Millimetres.of(line)), PerEye.both(Millimetres.of(pupil)));
        assertThatIllegalArgumentException()
                .as(source)
                .isThrownBy(() -> new Segment(null, new PerEye<>(null, Millimetres.of(offset)), heights, null));
    }

    @ParameterizedTest
    @EnumSource
    void everyFixationPreferenceIsReadAsItIsWrittenAndMirrored(FixationPreference preference) {
        assertThat(FixationPreference.parse(" " + preference.toString().toUpperCase(Locale.ROOT)))
                .isEqualTo(preference);
        assertThat(preference.mirrored().mirrored()).isEqualTo(preference);
        assertThat(preference.mirrored() == preference).isEqualTo(preference == FixationPreference.ALTERNATES);
    }

    @ParameterizedTest
    @EnumSource
    void onlyAProgressiveLensHasNoLine(SegmentStyle style) {
        Segment segment = new Segment(style, PerEye.none(), SegmentHeights.NONE, Millimetres.of(4));
        assertThat(segment.hasLine()).isEqualTo(style != SegmentStyle.PROGRESSIVE);
        assertThat(SegmentStyle.parse(" " + style.toString().toUpperCase(Locale.ROOT)))
                .isEqualTo(style);
    }

    @Test
    void anUnknownStyleCountsAsOneWithALine() {
        assertThat(Segment.NONE.hasLine()).isTrue();
    }

    @ParameterizedTest
    @EnumSource
    void everyAgentIsReadAsItIsWritten(CycloplegicAgent agent) {
        assertThat(CycloplegicAgent.parse(agent + " ")).isEqualTo(agent);
        assertThat(CycloplegicAgent.parse(agent.name())).isEqualTo(agent);
    }

    @Test
    void otherWordsAreNeitherDropsNorSegments() {
        Refused.assertThat(() -> CycloplegicAgent.parse("drops")).saying("agent", "unreadable", "drops");
        Refused.assertThat(() -> CycloplegicAgent.parse("a".repeat(61))).saying("agent", "long");
        Refused.assertThat(() -> SegmentStyle.parse("flat top")).saying("segment-style", "unreadable", "flat top");
        Refused.assertThat(() -> SegmentStyle.parse("a".repeat(61))).saying("segment-style", "long");
        Refused.assertThat(() -> FixationPreference.parse("right")).saying("fixation", "unreadable", "right");
        Refused.assertThat(() -> FixationPreference.parse("a".repeat(61))).saying("fixation", "long");
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.01, 24.01})
    void aDayHasNoSuchHours(double hours) {
        assertThatIllegalArgumentException().isThrownBy(() -> HoursPerDay.of(hours));
    }

    @Test
    void hoursHaveAUnitAndAreCompared() {
        assertThat(HoursPerDay.of(8).unit()).isEqualTo("h/day");
        assertThat(HoursPerDay.of(7.99).isUnder(HoursPerDay.of(8))).isTrue();
        assertThat(HoursPerDay.of(8).isUnder(HoursPerDay.of(8))).isFalse();
        assertThat(HoursPerDay.of(8).times(0.5)).isEqualTo(HoursPerDay.of(4));
    }

    @Test
    void stereoacuityHasSecondsOfArcUnlessNoneWasFound() {
        assertThat(new Stereo(40).inSecondsOfArc()).hasValue(40);
        assertThat(Stereo.NIL.inSecondsOfArc()).isEmpty();
        assertThatIllegalArgumentException().isThrownBy(() -> new Stereo(0));
        assertThatIllegalArgumentException().isThrownBy(() -> new Stereo(10_001));
        assertThat(new Stereo(1)).isNotEqualTo(new Stereo(10_000));
    }

    @Test
    void aReasonKeepsItsValuesInOrder() {
        List<Object> values = new ArrayList<>(List.of("a", 2));
        Reason reason = new Reason("key", values);
        values.clear();
        assertThat(reason).isEqualTo(Reason.of("key", "a", 2));
        assertThatThrownBy(() -> reason.values().clear()).isInstanceOf(UnsupportedOperationException.class);
    }

    private static LensPair pair(double add) {
        return new LensPair(PerEye.none(), Dioptres.of(add));
    }
}
