package plusward.handout;

import java.util.stream.Collectors;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ProblemDetail;
import org.springframework.http.ResponseEntity;
import org.springframework.web.bind.annotation.ExceptionHandler;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;
import org.springframework.web.server.ResponseStatusException;
import plusward.child.ChildCard;
import plusward.child.Children;
import plusward.exam.Reason;
import plusward.web.Paper;
import plusward.web.Sentences;

/** The sheet for other programs. */
@RestController
class HandoutApi {

    private final Children children;
    private final Handouts handouts;
    private final Sentences sentences;

    HandoutApi(Children children, Handouts handouts, Sentences sentences) {
        this.children = children;
        this.handouts = handouts;
        this.sentences = sentences;
    }

    @GetMapping("/api/children/{clinicNumber}/handout.pdf")
    ResponseEntity<byte[]> pdf(
            @PathVariable String clinicNumber,
            @RequestParam(defaultValue = "") String language,
            @RequestParam(defaultValue = "a4") String paper) {
        ChildCard child = children.findByClinicNumber(clinicNumber)
                .orElseThrow(() -> new ResponseStatusException(HttpStatus.NOT_FOUND));
        Sheet sheet = handouts.write(child, SheetLanguages.chosen(language, child.handoutLanguage()));
        return PdfAnswer.of(handouts.print(sheet, Paper.named(paper)), child);
    }

    @ExceptionHandler
    ResponseEntity<ProblemDetail> refuse(NoTrueSheet refusal) {
        String missing = refusal.missing().stream().map(sentences::of).collect(Collectors.joining(" "));
        ProblemDetail problem = ProblemDetail.forStatusAndDetail(HttpStatus.UNPROCESSABLE_CONTENT, missing);
        problem.setTitle(sentences.of(Reason.of("handout.missing.title")));
        return ResponseEntity.unprocessableContent()
                .contentType(MediaType.APPLICATION_PROBLEM_JSON)
                .body(problem);
    }
}
