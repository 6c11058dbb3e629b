package plusward.child;

import jakarta.servlet.http.HttpServletResponse;
import java.time.Clock;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.dao.OptimisticLockingFailureException;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.validation.BindingResult;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.ModelAttribute;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.server.ResponseStatusException;

/** The list of children, and the page on which one is added or corrected. */
@Controller
@RequestMapping("/children")
class ChildController {

    private static final int LAST_PAGE = 100_000;

    private final Children children;
    private final Clock clock;

    ChildController(Children children, Clock clock) {
        this.children = children;
        this.clock = clock;
    }

    @ModelAttribute("today")
    LocalDate today() {
        return LocalDate.now(clock);
    }

    @ModelAttribute
    void child(@PathVariable(required = false) @Nullable Long id, Model model) {
        if (id != null) {
            ChildCard child = children.find(id).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
            model.addAttribute("child", child);
        }
    }

    @GetMapping
    String list(@RequestParam(defaultValue = "") String q, @RequestParam(defaultValue = "0") int page, Model model) {
        model.addAttribute("q", q);
        model.addAttribute("found", children.search(q, Math.max(0, Math.min(page, LAST_PAGE))));
        return "child/children";
    }

    @GetMapping("/new")
    String blank(@ModelAttribute("form") ChildForm form) {
        return "child/edit";
    }

    @PostMapping("/new")
    String add(
            @ModelAttribute("form") ChildForm form,
            BindingResult errors,
            @RequestParam(defaultValue = "") String then) {
        ChildFormCheck.check(form, today(), errors);
        if (errors.hasErrors()) {
            return "child/edit";
        }
        try {
            long id = children.add(form.details()).id();
            return "redirect:/children/" + id + (then.equals("visit") ? "/visits/new" : "");
        } catch (DataIntegrityViolationException taken) {
            return refuseNumber(errors);
        }
    }

    @GetMapping("/{id}/edit")
    String show(@ModelAttribute(name = "child", binding = false) ChildCard child, Model model) {
        model.addAttribute("form", ChildForm.of(child));
        return "child/edit";
    }

    @PostMapping("/{id}/edit")
    String correct(
            @ModelAttribute(name = "child", binding = false) ChildCard child,
            @ModelAttribute("form") ChildForm form,
            BindingResult errors,
            HttpServletResponse response) {
        ChildFormCheck.check(form, today(), errors);
        return errors.hasErrors() ? "child/edit" : save(child, form, errors, response);
    }

    private String save(ChildCard stored, ChildForm form, BindingResult errors, HttpServletResponse response) {
        Integer version = form.getVersion();
        try {
            children.update(stored.id(), version == null ? -1 : version, form.details());
            return "redirect:/children/" + stored.id();
        } catch (OptimisticLockingFailureException overtaken) {
            response.setStatus(HttpStatus.CONFLICT.value());
            form.setVersion(stored.version());
            errors.reject("child.overtaken");
            return "child/edit";
        } catch (DataIntegrityViolationException taken) {
            return refuseNumber(errors);
        }
    }

    private static String refuseNumber(BindingResult errors) {
        errors.rejectValue("clinicNumber", "child.number.taken");
        return "child/edit";
    }
}
