package plusward.handout;

import org.springframework.http.ContentDisposition;
import org.springframework.http.HttpHeaders;
import org.springframework.http.MediaType;
import org.springframework.http.ResponseEntity;
import plusward.child.ChildCard;

/** A printed sheet as an answer: shown in the browser, saved under the child's clinic number. */
final class PdfAnswer {

    private PdfAnswer() {}

    static ResponseEntity<byte[]> of(byte[] pdf, ChildCard child) {
        String file = "handout-" + child.clinicNumber().replaceAll("[^A-Za-z0-9._-]", "_") + ".pdf";
        return ResponseEntity.ok()
                .contentType(MediaType.APPLICATION_PDF)
                .header(
                        HttpHeaders.CONTENT_DISPOSITION,
                        ContentDisposition.inline().filename(file).build().toString())
                .body(pdf);
    }
}
