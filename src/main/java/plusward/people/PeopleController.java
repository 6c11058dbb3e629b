package plusward.people;

import jakarta.validation.Valid;
import java.util.Set;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.validation.BindingResult;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.ModelAttribute;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.server.ResponseStatusException;

/** The administrator's list of accounts: add one, change one. */
@Controller
@RequestMapping("/people")
class PeopleController {

    private final Accounts accounts;

    /** An account in the list. */
    record Row(String name, String displayName, Set<Role> roles, boolean closed) {

        static Row of(Account account) {
            return new Row(account.name(), account.displayName(), account.roles(), account.isClosed());
        }
    }

    PeopleController(Accounts accounts) {
        this.accounts = accounts;
    }

    @ModelAttribute("allRoles")
    Role[] allRoles() {
        return Role.values();
    }

    @GetMapping
    String list(Model model) {
        model.addAttribute("accounts", accounts.all().stream().map(Row::of).toList());
        return "people/people";
    }

    @GetMapping("/new")
    String blank(@ModelAttribute("form") AccountForm form) {
        return "people/account";
    }

    @PostMapping("/new")
    String add(@Valid @ModelAttribute("form") AccountForm form, BindingResult errors) {
        Passphrase.check(form.getPassword(), errors);
        if (accounts.has(form.getName())) {
            errors.rejectValue("name", "people.name.taken");
        }
        return finish(
                errors,
                form,
                () -> accounts.add(form.getName(), form.getDisplayName(), form.getPassword(), form.getRoles()));
    }

    @GetMapping("/{name}")
    String show(@PathVariable String name, Model model) {
        model.addAttribute("form", AccountForm.of(existing(name)));
        return "people/account";
    }

    @PostMapping("/{name}")
    String change(@PathVariable String name, @Valid @ModelAttribute("form") AccountForm form, BindingResult errors) {
        Account account = existing(name);
        if (!form.getPassword().isEmpty()) {
            Passphrase.check(form.getPassword(), errors);
        }
        if (accounts.wouldLockOut(account, form)) {
            errors.rejectValue("roles", "people.roles.last-administrator");
        }
        return finish(errors, form, () -> accounts.change(name, form));
    }

    private static String finish(BindingResult errors, AccountForm form, Runnable command) {
        if (form.getRoles().isEmpty()) {
            errors.rejectValue("roles", "people.roles.missing");
        }
        if (errors.hasErrors()) {
            return "people/account";
        }
        command.run();
        return "redirect:/people";
    }

    private Account existing(String name) {
        return accounts.find(name).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }
}
