package plusward.people;

import jakarta.servlet.DispatcherType;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import org.springframework.core.annotation.Order;
import org.springframework.http.HttpMethod;
import org.springframework.security.config.Customizer;
import org.springframework.security.config.annotation.method.configuration.EnableMethodSecurity;
import org.springframework.security.config.annotation.web.builders.HttpSecurity;
import org.springframework.security.config.annotation.web.configurers.AuthorizeHttpRequestsConfigurer;
import org.springframework.security.config.annotation.web.configurers.FormLoginConfigurer;
import org.springframework.security.config.annotation.web.configurers.HeadersConfigurer;
import org.springframework.security.config.annotation.web.configurers.LogoutConfigurer;
import org.springframework.security.config.http.SessionCreationPolicy;
import org.springframework.security.crypto.factory.PasswordEncoderFactories;
import org.springframework.security.crypto.password.PasswordEncoder;
import org.springframework.security.web.SecurityFilterChain;
import org.springframework.security.web.header.writers.CrossOriginOpenerPolicyHeaderWriter.CrossOriginOpenerPolicy;
import org.springframework.security.web.header.writers.ReferrerPolicyHeaderWriter.ReferrerPolicy;
import org.springframework.security.web.savedrequest.HttpSessionRequestCache;
import org.springframework.security.web.savedrequest.NullRequestCache;
import org.springframework.security.web.servlet.util.matcher.PathPatternRequestMatcher;
import org.springframework.security.web.util.matcher.AndRequestMatcher;
import org.springframework.security.web.util.matcher.NegatedRequestMatcher;
import org.springframework.security.web.util.matcher.RequestHeaderRequestMatcher;

/** Two doors: programs come in by {@code /api}, people by the sign-in page. */
@Configuration(proxyBeanMethods = false)
@EnableMethodSecurity
class SecurityConfiguration {

    private static final String CONTENT_SECURITY_POLICY =
            "default-src 'self'; object-src 'none'; base-uri 'self'; " + "form-action 'self'; frame-ancestors 'none'";
    private static final String[] OPEN = {
        "/*.css", "/*.js", "/*.svg", "/webjars/**", "/actuator/health", "/sign-in", "/first-administrator"
    };
    private static final RequestHeaderRequestMatcher PART_OF_A_PAGE = new RequestHeaderRequestMatcher("HX-Request");

    @Bean
    PasswordEncoder passwordEncoder() {
        return PasswordEncoderFactories.createDelegatingPasswordEncoder();
    }

    @Bean
    @Order(1)
    SecurityFilterChain machineDoor(HttpSecurity http) {
        return http.securityMatcher("/api/**")
                .authorizeHttpRequests(requests -> requests.dispatcherTypeMatchers(DispatcherType.ERROR)
                        .permitAll()
                        .anyRequest()
                        .hasAnyRole("MACHINE", "ADMINISTRATOR"))
                .httpBasic(Customizer.withDefaults())
                .csrf(csrf -> csrf.disable())
                .sessionManagement(session -> session.sessionCreationPolicy(SessionCreationPolicy.STATELESS))
                .requestCache(cache -> cache.requestCache(new NullRequestCache()))
                .headers(SecurityConfiguration::harden)
                .build();
    }

    @Bean
    @Order(2)
    SecurityFilterChain peopleDoor(HttpSecurity http) {
        return http.authorizeHttpRequests(SecurityConfiguration::whoMayOpenWhat)
                .formLogin(SecurityConfiguration::signIn)
                .logout(SecurityConfiguration::signOut)
                .requestCache(cache -> cache.requestCache(pagesOnly()))
                .exceptionHandling(refusals ->
                        refusals.accessDeniedHandler(new LapsedSignIn()).authenticationEntryPoint(new AskToSignIn()))
                .headers(SecurityConfiguration::harden)
                .build();
    }

    private static void whoMayOpenWhat(
            AuthorizeHttpRequestsConfigurer<HttpSecurity>.AuthorizationManagerRequestMatcherRegistry requests) {
        requests.dispatcherTypeMatchers(DispatcherType.ERROR, DispatcherType.FORWARD)
                .permitAll()
                .requestMatchers(OPEN)
                .permitAll()
                .requestMatchers("/exchange/**", "/people/**", "/trail/**")
                .hasRole("ADMINISTRATOR")
                .requestMatchers("/limits/**")
                .hasRole("DOCTOR")
                .anyRequest()
                .hasAnyRole("STAFF", "DOCTOR");
    }

    private static void signIn(FormLoginConfigurer<HttpSecurity> form) {
        form.loginPage("/sign-in").failureUrl("/sign-in?refused").successHandler(new Landing(pagesOnly()));
    }

    private static void signOut(LogoutConfigurer<HttpSecurity> form) {
        form.logoutUrl("/sign-out").logoutSuccessUrl("/sign-in?out");
    }

    private static void harden(HeadersConfigurer<HttpSecurity> headers) {
        headers.contentSecurityPolicy(policy -> policy.policyDirectives(CONTENT_SECURITY_POLICY))
                .crossOriginOpenerPolicy(opener -> opener.policy(CrossOriginOpenerPolicy.SAME_ORIGIN))
                .frameOptions(frames -> frames.deny())
                .referrerPolicy(policy -> policy.policy(ReferrerPolicy.SAME_ORIGIN))
                .permissionsPolicyHeader(policy -> policy.policy("camera=(), microphone=(), geolocation=()"));
    }

    /** After signing in one returns to the page asked for, never to a piece of it. */
    private static HttpSessionRequestCache pagesOnly() {
        HttpSessionRequestCache cache = new HttpSessionRequestCache();
        PathPatternRequestMatcher.Builder paths = PathPatternRequestMatcher.withDefaults();
        cache.setRequestMatcher(new AndRequestMatcher(
                paths.matcher(HttpMethod.GET, "/**"),
                new NegatedRequestMatcher(paths.matcher("/favicon.ico")),
                new NegatedRequestMatcher(PART_OF_A_PAGE)));
        return cache;
    }
}
