package plusward.handout;

import jakarta.servlet.http.HttpServletRequest;
import org.springframework.http.HttpStatus;
import org.springframework.http.ResponseEntity;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.ExceptionHandler;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.server.ResponseStatusException;
import org.springframework.web.servlet.HandlerMapping;
import org.springframework.web.servlet.ModelAndView;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.web.Paper;

/** The sheet on the screen, and as a PDF. */
@Controller
class HandoutController {

    private final Children children;
    private final Handouts handouts;

    HandoutController(Children children, Handouts handouts) {
        this.children = children;
        this.handouts = handouts;
    }

    @GetMapping("/children/{id}/handout")
    String preview(
            @PathVariable long id,
            @RequestParam(defaultValue = "") String language,
            @RequestParam(defaultValue = "a4") String paper,
            Model model) {
        ChildCard child = child(id);
        Sheet sheet = sheet(child, language);
        model.addAttribute("child", child);
        model.addAttribute("sheet", sheet);
        model.addAttribute("paper", Paper.named(paper).code());
        model.addAttribute("grade", ReadingGrade.of(sheet));
        return "handout/preview";
    }

    @GetMapping("/children/{id}/handout.pdf")
    ResponseEntity<byte[]> pdf(
            @PathVariable long id,
            @RequestParam(defaultValue = "") String language,
            @RequestParam(defaultValue = "a4") String paper) {
        ChildCard child = child(id);
        return PdfAnswer.of(handouts.print(sheet(child, language), Paper.named(paper)), child);
    }

    @ExceptionHandler
    ModelAndView refuse(NoTrueSheet refusal, HttpServletRequest request) {
        ModelAndView page = new ModelAndView("handout/missing", HttpStatus.UNPROCESSABLE_CONTENT);
        page.addObject("missing", refusal.missing());
        page.addObject("path", request.getAttribute(HandlerMapping.URI_TEMPLATE_VARIABLES_ATTRIBUTE));
        return page;
    }

    private Sheet sheet(ChildCard child, String language) {
        return handouts.write(child, SheetLanguages.chosen(language, child.handoutLanguage()));
    }

    private ChildCard child(long id) {
        return children.find(id).orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
    }
}
