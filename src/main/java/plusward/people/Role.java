package plusward.people;

/** What an account may do; one account can hold several. */
enum Role {
    /** Logs visits, reads, prints handouts. */
    STAFF,
    /** All that staff does, and decides: orders, limits, setting a finding aside. */
    DOCTOR,
    /** Accounts, import, export, backup; no clinical page. */
    ADMINISTRATOR,
    /** Another program, through the machine door only. */
    MACHINE
}
