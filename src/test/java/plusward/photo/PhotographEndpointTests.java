package plusward.photo;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.allOf;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.not;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.csrf;
import static org.springframework.security.test.web.servlet.request.SecurityMockMvcRequestPostProcessors.user;
import static org.springframework.test.web.servlet.request.MockMvcRequestBuilders.post;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.content;
import static org.springframework.test.web.servlet.result.MockMvcResultMatchers.status;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.springframework.beans.factory.annotation.Autowired;
import org.springframework.test.web.servlet.MockMvc;
import org.springframework.test.web.servlet.ResultActions;
import org.springframework.test.web.servlet.request.MockHttpServletRequestBuilder;
import plusward.exam.MarkedFace;
import plusward.exam.SegmentMark;
import plusward.web.PageSlice;

@PageSlice(PhotographController.class)
class PhotographEndpointTests {

    @Autowired
    private MockMvc mvc;

    @Test
    void marksAreAnsweredWithLengthsTheirErrorsAndACaution() throws Exception {
        answer(MarkedFace.level())
                .andExpect(status().isOk())
                .andExpect(content()
                        .string(allOf(
                                containsString("segment top −2.4 ± 0.4 mm (below the pupil centre)"),
                                containsString("pupil 4.6 ± 0.5 mm"),
                                containsString("mean pupil 4.6 ± 0.3 mm"),
                                containsString("scale 0.100 mm a pixel; line tilted by 0.0° against the eyes"),
                                containsString("head tilted by 0.0° in the picture"),
                                containsString("a picture taken from above or below shifts the line"),
                                containsString("Use these values"))));
    }

    @Test
    void eachFieldOfTheVisitHasItsValueAsItIsTyped() throws Exception {
        answer(MarkedFace.level().with("left-line-start", "760 590").with("left-line-end", "1040 590"))
                .andExpect(content()
                        .string(allOf(
                                containsString("data-fill=\"segment_right_mm\" data-value=\"-2.4\""),
                                containsString("data-fill=\"segment_left_mm\" data-value=\"+1.0\""),
                                containsString("segment top +1.0 ± 0.4 mm (above the pupil centre)"),
                                containsString("data-fill=\"pupil_mm\" data-value=\"4.6\""))));
    }

    @Test
    void aLineThroughThePupilCentreIsAtIt() throws Exception {
        answer(MarkedFace.level().with("left-line-start", "760 600").with("left-line-end", "1040 600"))
                .andExpect(content().string(containsString("segment top 0.0 ± 0.4 mm (at the pupil centre)")));
    }

    @Test
    void coarseMarksAreSaidToBeCoarse() throws Exception {
        answer(MarkedFace.level()).andExpect(content().string(not(containsString("The marks are coarse"))));
        answer(MarkedFace.level().with("pixels-per-step", "4"))
                .andExpect(content().string(containsString("The marks are coarse")));
    }

    @ParameterizedTest
    @CsvSource(useHeadersInDisplayName = true, delimiter = '|', textBlock = """
            key                | text      | sentence
            left-pupil-centre  | ''        | 1 mark is missing: left eye: pupil, centre.
            left-pupil-centre  | 200 600   | The right eye is marked to the right of the left eye.
            left-pupil-centre  | 900 720   | The head is tilted by 11.3° in the picture, and over 10.0° the line cannot be judged.
            left-line-end      | 1040 680  | The line of the left lens is tilted by 11.3° against the eyes, over 10.0°
            right-pupil-top    | 300 640   | The pupil of the right eye is out of order
            right-line-end     | 170 624   | The line of the right lens is shorter than 40 pixels
            right-line-end     | 400 624   | The two lines give different scales, 0.117 and 0.100 mm a pixel.
            left-line-end      | NaN 3     | A mark lies outside the picture.
            right-pupil-bottom | 300 700   | The pupil of the right eye would be 12.3 mm wide
            width              | ''        | The true length of the segment’s top line is missing
            width              | <b>wide   | “&lt;b&gt;wide” cannot be read as the length of a segment’s top line.
            """)
    void whatCannotBeMeasuredIsRefusedWithItsReason(String key, String text, String sentence) throws Exception {
        MarkedFace face = MarkedFace.level().with(key, text);
        face = key.equals("right-pupil-bottom") ? face.with("right-pupil-centre", "300 630") : face;
        answer(face)
                .andExpect(status().isUnprocessableContent())
                .andExpect(content().string(allOf(containsString(sentence), not(containsString("Use these values")))));
    }

    @Test
    void farLinesAreRefusedWithTheirDistance() throws Exception {
        answer(MarkedFace.level().with("right-line-start", "160 850").with("right-line-end", "440 850"))
                .andExpect(status().isUnprocessableContent())
                .andExpect(content().string(containsString("would lie 25.0 mm from the pupil centre")));
    }

    @Test
    void nothingSentIsAnsweredByAFailureOfTheServer() throws Exception {
        Random random = new Random(4);
        String junk = "0123456789 .-,eENa∞\u0000\u202e<\"%{";
        for (int i = 0; i < 300; i++) {
            MarkedFace face = MarkedFace.level();
            for (SegmentMark mark : SegmentMark.values()) {
                face = random.nextInt(3) > 0 ? face : face.with(mark.key(), random(random, junk));
            }
            answer(face.with("width", random.nextBoolean() ? "28" : random(random, junk)))
                    .andExpect(result -> {
                        int status = result.getResponse().getStatus();
                        assertThat(status).isIn(200, 422);
                    });
        }
    }

    private static String random(Random random, String letters) {
        StringBuilder text = new StringBuilder();
        for (int length = random.nextInt(40); length > 0; length--) {
            text.append(letters.charAt(random.nextInt(letters.length())));
        }
        return text.toString();
    }

    @Test
    void aMegabyteIsRefusedLikeAnyOtherText() throws Exception {
        answer(MarkedFace.level().with("right-pupil-top", "9".repeat(1_000_000)).with("width", "9".repeat(1_000_000)))
                .andExpect(status().isUnprocessableContent());
    }

    @Test
    void nobodyMeasuresWithoutSigningInOrWithoutTheToken() throws Exception {
        mvc.perform(filled(MarkedFace.level()).with(csrf()).header("HX-Request", "true"))
                .andExpect(status().isUnauthorized());
        mvc.perform(filled(MarkedFace.level()).with(user("staff").roles("STAFF")))
                .andExpect(status().isForbidden());
        mvc.perform(filled(MarkedFace.level()).with(csrf()).with(user("machine").roles("MACHINE")))
                .andExpect(status().isForbidden());
    }

    private ResultActions answer(MarkedFace face) throws Exception {
        return mvc.perform(filled(face).with(csrf()).with(user("staff").roles("STAFF")));
    }

    private static MockHttpServletRequestBuilder filled(MarkedFace face) {
        MockHttpServletRequestBuilder request = post("/segment-from-photo");
        face.typed().forEach(request::param);
        return request;
    }
}
