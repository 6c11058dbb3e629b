package plusward.web;

/** Someone with a name to show beside "Sign out". */
public interface SignedIn {

    String displayName();
}
