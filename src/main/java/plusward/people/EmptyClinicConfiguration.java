package plusward.people;

import org.springframework.boot.security.autoconfigure.web.servlet.SecurityFilterProperties;
import org.springframework.boot.web.servlet.FilterRegistrationBean;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;

/** Puts the guard of an empty clinic before the sign-in. */
@Configuration(proxyBeanMethods = false)
class EmptyClinicConfiguration {

    @Bean
    FilterRegistrationBean<EmptyClinicFilter> emptyClinic(Accounts accounts) {
        FilterRegistrationBean<EmptyClinicFilter> filter =
                new FilterRegistrationBean<>(new EmptyClinicFilter(accounts));
        filter.setOrder(SecurityFilterProperties.DEFAULT_FILTER_ORDER - 1);
        return filter;
    }
}
