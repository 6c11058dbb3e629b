package plusward.photo;

import java.util.Map;
import org.springframework.http.HttpStatus;
import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.ExceptionHandler;
import org.springframework.web.bind.annotation.PostMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.ResponseStatus;
import plusward.exam.MarksReader;
import plusward.exam.RefusedMarks;

/** Answers marks on a photograph with what they measure, as a piece of the entry page. Keeps nothing. */
@Controller
class PhotographController {

    @PostMapping("/segment-from-photo")
    String measure(@RequestParam Map<String, String> marks, Model model) {
        model.addAttribute("measured", Measured.of(MarksReader.read(marks)));
        return "photo/measured";
    }

    @ExceptionHandler
    @ResponseStatus(HttpStatus.UNPROCESSABLE_CONTENT)
    String refuse(RefusedMarks refused, Model model) {
        model.addAttribute("refused", refused.reason());
        return "photo/measured";
    }
}
