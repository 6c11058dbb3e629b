package plusward.web;

/** The clinic as it is named on pages and sheets. Empty phone or address: not given. */
public record Clinic(String name, String phone, String address) {}
