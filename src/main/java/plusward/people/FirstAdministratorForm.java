package plusward.people;

/** The first account, with the code from the console. */
class FirstAdministratorForm extends AccountForm {

    private String code = "";

    public String getCode() {
        return code;
    }

    public void setCode(String code) {
        this.code = code;
    }
}
