package plusward.exchange;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.Map;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Files as clinics send them, in an empty clinic on 2026-06-01.
 *
 * <p>In the tables ⏎ is a line break and ⇥ a tab; a refusal is written {@code row column key}.
 */
class OddFilesTests {

    private static final LocalDate TODAY = LocalDate.of(2026, 6, 1);
    private static final String CHILD = "clinic_number,birth_date⏎A-1,2020-01-31";

    @ParameterizedTest(name = "{0}")
    @CsvSource(delimiter = '|', quoteCharacter = '`', useHeadersInDisplayName = true, textBlock = """
            what                      | children.csv                                                                  | new
            comma                     | clinic_number,birth_date⏎A-1,2020-01-31                                       | 1
            semicolon                 | clinic_number;birth_date⏎A-1;2020-01-31                                       | 1
            tab                       | clinic_number⇥birth_date⏎A-1⇥2020-01-31                                       | 1
            semicolons beat a comma   | clinic_number;given_name;birth_date;note⏎A-1;;2020-01-31;"a, b, c"            | 1
            quoted header             | "clinic_number","birth_date"⏎"A-1","2020-01-31"                               | 1
            columns in another order  | birth_date,clinic_number⏎2020-01-31,A-1                                       | 1
            capitals and blanks       | Clinic_Number , BIRTH_DATE⏎A-1, 2020-01-31                                    | 1
            header only               | clinic_number,birth_date                                                      | 0
            line break at the end     | clinic_number,birth_date⏎A-1,2020-01-31⏎                                      | 1
            empty rows between        | clinic_number,birth_date⏎⏎A-1,2020-01-31⏎,⏎A-2,2020-01-31⏎⏎                   | 2
            line break in a cell      | clinic_number,birth_date,note⏎A-1,2020-01-31,"one⏎two"⏎A-2,2020-01-31,        | 2
            doubled quotes            | clinic_number,birth_date,note⏎A-1,2020-01-31,"she said ""turns"" twice"       | 1
            a quote inside a cell     | clinic_number,birth_date,note⏎A-1,2020-01-31,5" tall                          | 1
            a cell like a formula     | clinic_number,birth_date,note⏎A-1,2020-01-31,=SUM(1+1)*cmd                    | 1
            columns left over, empty  | clinic_number,birth_date,,⏎A-1,2020-01-31,,                                   | 1
            the language in capitals  | clinic_number,birth_date,handout_language⏎A-1,2020-01-31,ES                   | 1
            born today                | clinic_number,birth_date⏎A-1,2026-06-01                                       | 1
            letters of all alphabets  | clinic_number,birth_date,given_name⏎A-1,2020-01-31,Şükrü 李 Žofie              | 1
            """)
    void takesInWhatDiffersInFormOnly(String what, String file, int expected) {
        Plan plan = judge(file, null);
        assertThat(refusals(plan)).as(what).isEmpty();
        assertThat(plan.counts().added()).isEqualTo(expected);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(delimiter = '|', quoteCharacter = '`', useHeadersInDisplayName = true, textBlock = """
            what                      | file                                                       | row column key
            nothing at all            | ⏎                                                          | 1  empty
            only the other file       | clinic_number,visit_date⏎A-1,2024-01-31                    | 1  other-file
            no birth dates            | clinic_number,given_name⏎A-1,Ann                           | 1 birth_date missing-column
            no header                 | A-1,2020-01-31                                             | 1 a-1 unknown-column; 1 2020-01-31 unknown-column; 1 clinic_number missing-column; 1 birth_date missing-column
            a first row of blanks     | ,⏎clinic_number,birth_date⏎A-1,2020-01-31                  | 1 clinic_number missing-column; 1 birth_date missing-column
            decimal comma, no match   | clinic_number birth_date⏎A-1 2020-01-31                    | 1 clinic_number birth_date unknown-column; 1 clinic_number missing-column; 1 birth_date missing-column
            a column of their own     | clinic_number,birth_date,phone⏎A-1,2020-01-31,1            | 1 phone unknown-column
            the same column twice     | clinic_number,note,birth_date,note⏎A-1,a,2020-01-31,b      | 1 note duplicate-column
            a column without a name   | clinic_number,,birth_date⏎A-1,,2020-01-31                  | 1 B unknown-column
            a cell beside the columns | clinic_number,birth_date,⏎A-1,2020-01-31,x                 | 2 C unnamed-column
            a row cut short           | clinic_number,given_name,birth_date⏎A-1,Ann                | 2 birth_date few-cells
            a comma too many          | clinic_number,birth_date⏎A-1,,2020-01-31                   | 2 C many-cells
            an unquoted comma         | clinic_number,birth_date,note⏎A-1,2020-01-31,a, b          | 2 D many-cells
            a quote never closed      | clinic_number,birth_date,note⏎A-1,2020-01-31,"and          | 2  quotes
            text behind a quote       | clinic_number,birth_date,note⏎A-1,2020-01-31,"a" b         | 2  quotes
            no clinic number          | clinic_number,birth_date⏎,2020-01-31                       | 2 clinic_number missing-cell
            a number with a blank     | clinic_number,birth_date⏎A 1,2020-01-31                    | 2 clinic_number clinic-number
            a number like a formula   | clinic_number,birth_date⏎=A1,2020-01-31                    | 2 clinic_number clinic-number
            21 letters of number      | clinic_number,birth_date⏎A12345678901234567890,2020-01-31  | 2 clinic_number clinic-number
            no birth date             | clinic_number,birth_date⏎A-1,                              | 2 birth_date missing-cell
            a number twice            | clinic_number,birth_date⏎A-1,2020-01-31⏎⏎A-1,2020-01-31    | 4 clinic_number child-twice
            twice but for blanks      | clinic_number,birth_date⏎A-1,2020-01-31⏎ A-1 ,2020-01-31   | 3 clinic_number child-twice
            day, month, year          | clinic_number,birth_date⏎A-1,31/01/2020                    | 2 birth_date notation.date.unreadable
            born tomorrow             | clinic_number,birth_date⏎A-1,2026-06-02                    | 2 birth_date future
            half a month              | clinic_number,birth_date,turn_first_seen_months⏎A-1,2020-01-31,30.5 | 2 turn_first_seen_months months
            217 months                | clinic_number,birth_date,turn_first_seen_months⏎A-1,2020-01-31,217  | 2 turn_first_seen_months months
            a language not offered    | clinic_number,birth_date,handout_language⏎A-1,2020-01-31,fr         | 2 handout_language language
            a tab in a name           | clinic_number,birth_date,given_name⏎A-1,2020-01-31,Ann⇥Lee          | 2 given_name control
            columns swapped           | clinic_number,birth_date⏎2020-01-31,A-1                    | 2 birth_date notation.date.unreadable
            two faults in two rows    | clinic_number,birth_date⏎A-1,x⏎,2020-01-31                 | 2 birth_date notation.date.unreadable; 3 clinic_number missing-cell
            """)
    void namesWhatIsWrongWithChildren(String what, String file, String expected) {
        Plan plan = judge(file, null);
        assertThat(refusals(plan)).as(what).isEqualTo(expected);
    }

    @ParameterizedTest(name = "{0}")
    @CsvSource(delimiter = '|', quoteCharacter = '`', useHeadersInDisplayName = true, textBlock = """
            what                      | file                                                       | row column key
            a stranger                | clinic_number,visit_date⏎A-2,2024-05-01                            | 2 clinic_number unknown-child
            no child                  | clinic_number,visit_date⏎,2024-05-01                               | 2 clinic_number missing-cell
            no date                   | clinic_number,visit_date⏎A-1,                                      | 2 visit_date notation.date.missing
            tomorrow                  | clinic_number,visit_date⏎A-1,2026-06-02                            | 2 visit_date future
            the day before birth      | clinic_number,visit_date⏎A-1,2020-01-30                            | 2 visit_date before-birth
            one date twice            | clinic_number,visit_date⏎A-1,2024-05-01⏎A-1,2024-05-01             | 3 visit_date visit-twice
            the American date         | clinic_number,visit_date⏎A-1,05/01/2024                            | 2 visit_date notation.date.unreadable
            a lens without a sign     | clinic_number,visit_date,worn_right⏎A-1,2024-05-01,3.50            | 2 worn_right notation.lens.sign
            a turn in a lens column   | clinic_number,visit_date,worn_left⏎A-1,2024-05-01,ET 25            | 2 worn_left notation.lens.unreadable
            a lens in a turn column   | clinic_number,visit_date,turn_cc_near⏎A-1,2024-05-01,+3.50         | 2 turn_cc_near notation.turn.unreadable
            a near prime at distance  | clinic_number,visit_date,turn_cc_distance⏎A-1,2024-05-01,ET' 12    | 2 turn_cc_distance notation.turn.prime
            a formula as a lens       | clinic_number,visit_date,worn_right⏎A-1,2024-05-01,=3.5            | 2 worn_right notation.lens.unreadable
            hours beyond a day        | clinic_number,visit_date,wear_hours⏎A-1,2024-05-01,25              | 2 wear_hours notation.hours.range
            an unknown agent          | clinic_number,visit_date,cycloplegic_agent⏎A-1,2024-05-01,drops    | 2 cycloplegic_agent notation.agent.unreadable
            three faults in one row   | clinic_number,visit_date,worn_right,worn_left⏎A-2,x,3,4            | 2 clinic_number unknown-child; 2 visit_date notation.date.unreadable; 2 worn_right notation.lens.sign; 2 worn_left notation.lens.sign
            """)
    void namesWhatIsWrongWithVisits(String what, String file, String expected) {
        Plan plan = judge(CHILD, file);
        assertThat(refusals(plan)).as(what).isEqualTo(expected);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "0"})
    void keepsNotMeasuredApartFromZero(String cell) {
        Plan plan = judge(CHILD, "clinic_number,visit_date,wear_hours⏎A-1,2024-05-01," + cell);
        assertThat(plan.visits().added().get(0).examination().glasses().wear() == null)
                .isEqualTo(cell.isBlank());
    }

    @Test
    void acceptsAByteOrderMark() {
        byte[] bytes = typed("\uFEFF" + CHILD).getBytes(StandardCharsets.UTF_8);
        assertThat(judge(bytes).counts().added()).isEqualTo(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"ISO-8859-1", "windows-1252", "UTF-16", "UTF-16LE", "UTF-16BE"})
    void refusesOtherEncodingsByTheRow(String encoding) {
        String file = typed("clinic_number,birth_date,given_name⏎A-1,2020-01-31,Ann⏎A-2,2020-01-31,Zoë");
        String row = encoding.startsWith("UTF") ? "1" : "3";
        assertThat(refusals(judge(file.getBytes(Charset.forName(encoding))))).isEqualTo(row + "  encoding");
    }

    @Test
    void refusesTextThatEndsWithinALetter() {
        byte[] whole = typed(CHILD + ",ë").getBytes(StandardCharsets.UTF_8);
        byte[] cut = Arrays.copyOf(whole, whole.length - 1);
        assertThat(refusals(judge(cut))).isEqualTo("2  encoding");
    }

    @Test
    void refusesAWorkbookAndAnEmptyFile() {
        assertThat(refusals(judge(new byte[] {'P', 'K', 3, 4, 20, 0}))).isEqualTo("1  workbook");
        assertThat(refusals(judge(new byte[] {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0})))
                .isEqualTo("1  workbook");
        assertThat(refusals(judge(new byte[0]))).isEqualTo("1  empty");
    }

    @Test
    void namesAHugeCellWithoutRepeatingAllOfIt() {
        Plan plan = judge("clinic_number,birth_date,note⏎A-1,2020-01-31," + "x".repeat(1_000_000), null);
        assertThat(refusals(plan)).isEqualTo("2 note long");
        assertThat(plan.refusals().listed().get(0).read()).hasSize(201).endsWith("…");
    }

    @Test
    void listsFiveHundredRefusalsAndCountsTheOthers() {
        Plan plan = judge("clinic_number,birth_date" + "⏎,x".repeat(400), null);
        assertThat(plan.refusals().listed()).hasSize(500);
        assertThat(plan.refusals().more()).isEqualTo(300);
        assertThat(plan.refusals().rowsOf(CsvKind.CHILDREN)).isEqualTo(400);
    }

    @Test
    void refusesMoreRowsThanOneImportCanHold() {
        Plan plan = judge("clinic_number,birth_date" + "⏎".repeat(SheetReader.MOST_ROWS + 1) + "A-1,2020-01-31", null);
        assertThat(refusals(plan)).isEqualTo(SheetReader.MOST_ROWS + 2 + "  rows");
    }

    @Test
    void doesNotCallTheVisitsOfARefusedChildAStrangers() {
        String visits = "clinic_number,visit_date⏎A-1,2024-05-01";
        assertThat(refusals(judge("clinic_number,birth_date⏎A-1,soon", visits)))
                .isEqualTo("2 birth_date notation.date.unreadable");
        assertThat(refusals(judge("clinic_number,birth_date⏎A-1", visits))).isEqualTo("2 birth_date few-cells");
        assertThat(refusals(judge("clinic_number⏎A-1", visits))).isEqualTo("1 birth_date missing-column");
    }

    private static Plan judge(String children, @Nullable String visits) {
        return judge(bytes(children), visits == null ? null : bytes(visits));
    }

    private static Plan judge(byte[] children) {
        return judge(children, null);
    }

    private static Plan judge(byte[] children, byte @Nullable [] visits) {
        return new Judge(new CsvPair(children, visits)).judge(new StoredClinic(Map.of(), Map.of()), TODAY);
    }

    private static byte[] bytes(String file) {
        return typed(file).getBytes(StandardCharsets.UTF_8);
    }

    private static String typed(String file) {
        return file.replace('⏎', '\n').replace('⇥', '\t');
    }

    private static String refusals(Plan plan) {
        return plan.refusals().listed().stream()
                .map(cell -> cell.row() + " " + cell.column() + " "
                        + cell.problem().key().replace("exchange.problem.", ""))
                .collect(Collectors.joining("; "));
    }
}
