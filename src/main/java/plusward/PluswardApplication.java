package plusward;

import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;

/** Starts the application: an empty clinic of your own, or with the profile {@code demo} the demonstration clinic. */
@SpringBootApplication
public class PluswardApplication {

    public static void main(String[] args) {
        SpringApplication.run(PluswardApplication.class, args);
    }
}
