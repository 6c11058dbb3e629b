package plusward.exchange;

import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.security.Principal;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.springframework.dao.ConcurrencyFailureException;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.multipart.MultipartFile;
import org.springframework.web.servlet.mvc.support.RedirectAttributes;
import plusward.exchange.ExchangePage.Preview;
import plusward.exchange.Outcome.Counts;

/** The page for bringing files in: choose, look, bring in. */
@Controller
@RequestMapping("/exchange")
class ExchangeController {

    private static final String HERE = "redirect:/exchange";

    private final Imports imports;
    private final Uploads uploads;

    ExchangeController(Imports imports, Uploads uploads) {
        this.imports = imports;
        this.uploads = uploads;
    }

    @GetMapping
    String show(Principal account, Model model) {
        return page(account, model, false);
    }

    @PostMapping
    String choose(
            @RequestParam(required = false) @Nullable MultipartFile children,
            @RequestParam(required = false) @Nullable MultipartFile visits,
            Principal account,
            Model model,
            HttpServletResponse response)
            throws IOException {
        CsvPair files = CsvPair.of(children, visits);
        if (files.isEmpty()) {
            response.setStatus(HttpServletResponse.SC_UNPROCESSABLE_CONTENT);
            return page(account, model, true);
        }
        uploads.keep(account.getName(), files);
        return HERE;
    }

    @PostMapping("/apply")
    String apply(@RequestParam(defaultValue = "") String seen, Principal account, RedirectAttributes next) {
        Optional<CsvPair> files = uploads.of(account.getName());
        if (files.isEmpty()) {
            next.addFlashAttribute("trouble", "exchange.gone");
            return HERE;
        }
        Counts done = bringIn(files.get(), seen);
        if (done == null) {
            next.addFlashAttribute("trouble", "exchange.moved");
        } else {
            uploads.forget(account.getName());
            next.addFlashAttribute("done", new int[] {done.added(), done.changed(), done.same()});
        }
        return HERE;
    }

    @PostMapping("/leave")
    String leave(Principal account, RedirectAttributes next) {
        uploads.forget(account.getName());
        next.addFlashAttribute("left", true);
        return HERE;
    }

    /** Absent when the clinic's records are no longer as they were looked at, up to the moment of storing. */
    private @Nullable Counts bringIn(CsvPair files, String seen) {
        try {
            return imports.bringInAsSeen(files, seen).orElse(null);
        } catch (ConcurrencyFailureException | DataIntegrityViolationException someoneElseSaved) {
            return null;
        }
    }

    private String page(Principal account, Model model, boolean noFile) {
        Preview preview = uploads.of(account.getName())
                .map(files -> Preview.of(imports.look(files), files))
                .orElse(null);
        String trouble = (String) model.getAttribute("trouble");
        model.addAttribute("page", new ExchangePage(preview, trouble, noFile));
        return "exchange/exchange";
    }
}
