package plusward.exchange;

import java.io.IOException;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.springframework.dao.ConcurrencyFailureException;
import org.springframework.dao.DataIntegrityViolationException;
import org.springframework.http.HttpStatus;
import org.springframework.http.MediaType;
import org.springframework.http.ProblemDetail;
import org.springframework.http.ResponseEntity;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;
import org.springframework.web.multipart.MultipartFile;
import plusward.exam.Reason;
import plusward.web.Sentences;

/** The machine door for bringing files in. */
@RestController
class ImportApi {

    private final Imports imports;
    private final Sentences sentences;

    ImportApi(Imports imports, Sentences sentences) {
        this.imports = imports;
        this.sentences = sentences;
    }

    @PostMapping(path = "/api/import", consumes = MediaType.MULTIPART_FORM_DATA_VALUE)
    ResponseEntity<?> bringIn(
            @RequestParam(required = false) @Nullable MultipartFile children,
            @RequestParam(required = false) @Nullable MultipartFile visits,
            @RequestParam(defaultValue = "false") String apply)
            throws IOException {
        CsvPair files = CsvPair.of(children, visits);
        if (!List.of("true", "false").contains(apply)) {
            return problem(HttpStatus.BAD_REQUEST, "apply");
        }
        return files.isEmpty() ? problem(HttpStatus.BAD_REQUEST, "no-file") : answer(files, apply.equals("true"));
    }

    private ResponseEntity<?> answer(CsvPair files, boolean apply) {
        try {
            Plan plan = apply ? imports.bringIn(files) : imports.look(files);
            return ResponseEntity.status(plan.isRefused() ? HttpStatus.UNPROCESSABLE_CONTENT : HttpStatus.OK)
                    .body(ImportAnswer.of(plan, apply, sentences));
        } catch (ConcurrencyFailureException | DataIntegrityViolationException someoneElseSaved) {
            return problem(HttpStatus.CONFLICT, "conflict");
        }
    }

    private ResponseEntity<ProblemDetail> problem(HttpStatus status, String key) {
        ProblemDetail problem =
                ProblemDetail.forStatusAndDetail(status, sentences.of(Reason.of("exchange.api." + key)));
        problem.setTitle(sentences.of(Reason.of("exchange.api." + key + ".title")));
        return ResponseEntity.of(problem).build();
    }
}
