package plusward.people;

import org.springframework.stereotype.Controller;
import org.springframework.ui.Model;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.RequestParam;

@Controller
class SignInController {

    @GetMapping("/sign-in")
    String signIn(@RequestParam(defaultValue = "") String back, Model model) {
        model.addAttribute("back", back);
        return "people/sign-in";
    }
}
