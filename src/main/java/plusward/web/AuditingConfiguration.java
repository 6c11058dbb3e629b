package plusward.web;

import java.time.Clock;
import java.util.Optional;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import org.springframework.data.auditing.DateTimeProvider;
import org.springframework.data.domain.AuditorAware;
import org.springframework.data.jpa.repository.config.EnableJpaAuditing;
import org.springframework.security.core.Authentication;
import org.springframework.security.core.context.SecurityContextHolder;

/** Who and when, for every stored row that asks with {@code @CreatedBy} and {@code @LastModifiedDate}. */
@Configuration(proxyBeanMethods = false)
@EnableJpaAuditing(auditorAwareRef = "accountName", dateTimeProviderRef = "now")
class AuditingConfiguration {

    /** The name of the signed-in account; absent for work that the application does by itself. */
    @Bean
    AuditorAware<String> accountName() {
        return () -> Optional.ofNullable(SecurityContextHolder.getContext().getAuthentication())
                .map(Authentication::getName);
    }

    @Bean
    DateTimeProvider now(Clock clock) {
        return () -> Optional.of(clock.instant());
    }
}
