package plusward.exchange;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.springframework.boot.test.context.SpringBootTest;
import org.springframework.boot.test.context.SpringBootTest.WebEnvironment;
import org.springframework.boot.webmvc.test.autoconfigure.AutoConfigureMockMvc;
import org.springframework.test.context.TestPropertySource;
import org.springframework.test.context.jdbc.Sql;
import plusward.web.AClinicInMemory;

/** The whole application on a database in memory, empty before each test but for two accounts. */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@SpringBootTest(webEnvironment = WebEnvironment.RANDOM_PORT)
@AutoConfigureMockMvc
@AClinicInMemory
@TestPropertySource(properties = "spring.jpa.properties.hibernate.generate_statistics=true")
@Sql("/plusward/exchange/empty-clinic.sql")
@interface WholeClinic {}
