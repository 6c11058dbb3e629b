package plusward.child;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/** A child as it is typed: every answer as text, so that what was refused comes back as it was. */
class ChildForm {

    private String clinicNumber = "";
    private String givenName = "";
    private String familyName = "";
    private String bornOn = "";
    private String turnFirstSeenMonths = "";
    private String handoutLanguage = "en";
    private String note = "";
    private @Nullable Integer version;

    static ChildForm of(ChildCard child) {
        ChildForm form = new ChildForm();
        form.clinicNumber = child.clinicNumber();
        form.givenName = text(child.givenName());
        form.familyName = text(child.familyName());
        form.bornOn = child.bornOn().toString();
        form.turnFirstSeenMonths = text(child.turnFirstSeenMonths());
        form.handoutLanguage = child.handoutLanguage();
        form.note = text(child.note());
        form.version = child.version();
        return form;
    }

    /** What was typed, as values. Only for a form that {@link ChildFormCheck} found nothing wrong with. */
    ChildDetails details() {
        String months = turnFirstSeenMonths.strip();
        return new ChildDetails(
                clinicNumber.strip(),
                absentWhenBlank(givenName),
                absentWhenBlank(familyName),
                LocalDate.parse(bornOn.strip()),
                months.isEmpty() ? null : Integer.valueOf(months),
                handoutLanguage,
                absentWhenBlank(note.replace("\r\n", "\n")));
    }

    private static String text(@Nullable Object value) {
        return value == null ? "" : value.toString();
    }

    private static @Nullable String absentWhenBlank(String typed) {
        return typed.isBlank() ? null : typed.strip();
    }

    public String getClinicNumber() {
        return clinicNumber;
    }

    public void setClinicNumber(String clinicNumber) {
        this.clinicNumber = clinicNumber;
    }

    public String getGivenName() {
        return givenName;
    }

    public void setGivenName(String givenName) {
        this.givenName = givenName;
    }

    public String getFamilyName() {
        return familyName;
    }

    public void setFamilyName(String familyName) {
        this.familyName = familyName;
    }

    public String getBornOn() {
        return bornOn;
    }

    public void setBornOn(String bornOn) {
        this.bornOn = bornOn;
    }

    public String getTurnFirstSeenMonths() {
        return turnFirstSeenMonths;
    }

    public void setTurnFirstSeenMonths(String turnFirstSeenMonths) {
        this.turnFirstSeenMonths = turnFirstSeenMonths;
    }

    public String getHandoutLanguage() {
        return handoutLanguage;
    }

    public void setHandoutLanguage(String handoutLanguage) {
        this.handoutLanguage = handoutLanguage;
    }

    public String getNote() {
        return note;
    }

    public void setNote(String note) {
        this.note = note;
    }

    public @Nullable Integer getVersion() {
        return version;
    }

    public void setVersion(@Nullable Integer version) {
        this.version = version;
    }
}
