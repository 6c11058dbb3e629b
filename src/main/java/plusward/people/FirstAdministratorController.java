package plusward.people;

import jakarta.validation.Valid;
import java.util.Set;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.validation.BindingResult;
import org.springframework.web.bind.WebDataBinder;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.InitBinder;
import org.springframework.web.bind.annotation.ModelAttribute;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.server.ResponseStatusException;

/** Makes the first account of an empty clinic; afterwards there is no such page. */
@Controller
class FirstAdministratorController {

    private final Accounts accounts;
    private final OneTimeCode code;

    FirstAdministratorController(Accounts accounts, OneTimeCode code) {
        this.accounts = accounts;
        this.code = code;
    }

    @InitBinder
    void only(WebDataBinder binder) {
        binder.setAllowedFields("code", "name", "displayName", "password");
    }

    @GetMapping("/first-administrator")
    String show(@ModelAttribute("form") FirstAdministratorForm form) {
        onlyWhileEmpty();
        return "people/first-administrator";
    }

    @PostMapping("/first-administrator")
    String make(@Valid @ModelAttribute("form") FirstAdministratorForm form, BindingResult errors) {
        onlyWhileEmpty();
        Passphrase.check(form.getPassword(), errors);
        if (!errors.hasErrors() && !code.spend(form.getCode())) {
            errors.rejectValue("code", "people.code.refused");
        }
        if (errors.hasErrors()) {
            return "people/first-administrator";
        }
        accounts.add(form.getName(), form.getDisplayName(), form.getPassword(), Set.of(Role.ADMINISTRATOR));
        return "redirect:/sign-in?made";
    }

    private void onlyWhileEmpty() {
        if (!accounts.isEmpty()) {
            throw new ResponseStatusException(HttpStatus.NOT_FOUND);
        }
    }
}
