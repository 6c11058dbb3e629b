package plusward.web;

import java.util.List;
import org.springframework.security.authentication.AnonymousAuthenticationToken;
import org.springframework.security.core.Authentication;
import org.springframework.security.core.context.SecurityContextHolder;
import org.springframework.web.context.request.RequestContextHolder;
import org.springframework.web.context.request.ServletRequestAttributes;

/** What the layout needs to know of this request: who is signed in, and which places to offer. */
public final class Screen {

    private static final List<String> CLINICAL = List.of("STAFF", "DOCTOR");
    private static final List<String> ADMINISTRATION = List.of("ADMINISTRATOR");

    private static final List<Destination> DESTINATIONS = List.of(
            new Destination("/", "layout.needs-a-look", CLINICAL),
            new Destination("/children", "layout.children", CLINICAL),
            new Destination("/exchange", "layout.exchange", ADMINISTRATION),
            new Destination("/people", "layout.people", ADMINISTRATION));

    Screen() {}

    /** A place in the navigation. */
    public record Place(String path, String key, boolean current) {}

    public boolean isSignedIn() {
        Authentication who = SecurityContextHolder.getContext().getAuthentication();
        return who != null && who.isAuthenticated() && !(who instanceof AnonymousAuthenticationToken);
    }

    /** The name to greet with; the account's name where no other is known. */
    public String signedInName() {
        Authentication who = SecurityContextHolder.getContext().getAuthentication();
        if (who == null) {
            return "";
        }
        return who.getPrincipal() instanceof SignedIn person ? person.displayName() : who.getName();
    }

    /** True when the signed-in account has one of these roles. */
    public boolean may(String... roles) {
        return may(List.of(roles));
    }

    private static boolean may(List<String> roles) {
        Authentication who = SecurityContextHolder.getContext().getAuthentication();
        return who != null
                && who.getAuthorities().stream()
                        .map(each -> String.valueOf(each.getAuthority()))
                        .anyMatch(held -> held.startsWith("ROLE_") && roles.contains(held.substring(5)));
    }

    /** Where this account may go from any page. */
    public List<Place> places() {
        return DESTINATIONS.stream()
                .filter(each -> may(each.roles()))
                .map(each -> new Place(each.path(), each.key(), isHere(each.path())))
                .toList();
    }

    private static boolean isHere(String path) {
        return RequestContextHolder.getRequestAttributes() instanceof ServletRequestAttributes attributes
                && (attributes.getRequest().getServletPath() + "/").startsWith(path.equals("/") ? "//" : path + "/");
    }

    private record Destination(String path, String key, List<String> roles) {}
}
