package skytally.web;

import jakarta.servlet.DispatcherType;
import jakarta.servlet.Filter;
import jakarta.servlet.http.HttpServletResponse;
import org.springframework.beans.factory.annotation.Value;
import org.springframework.boot.web.servlet.FilterRegistrationBean;
import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import org.springframework.core.Ordered;
import org.springframework.security.config.annotation.web.builders.HttpSecurity;
import org.springframework.security.config.annotation.web.configurers.AbstractHttpConfigurer;
import org.springframework.security.config.http.SessionCreationPolicy;
import org.springframework.security.web.SecurityFilterChain;
import org.springframework.security.web.csrf.CookieCsrfTokenRepository;
import org.springframework.util.unit.DataSize;

/**
 * Who may ask for what. There are no accounts: whoever sits at this computer may do everything, and no page from
 * elsewhere may do anything in their name. Nothing is remembered in a session, so a restart of the server forgets
 * nothing: the form token lives in a cookie of the browser.
 */
@Configuration(proxyBeanMethods = false)
class SecurityWiring {

    private static final String FORM_TOKEN_COOKIE = "skytally-form";

    @Bean
    FilterRegistrationBean<PageHeadersFilter> pageHeaders() {
        return first(new PageHeadersFilter(), 0);
    }

    @Bean
    FilterRegistrationBean<HostFilter> hostFilter(WebProperties properties) {
        return first(new HostFilter(properties.hostNames()), 1);
    }

    @Bean
    FilterRegistrationBean<CrossSiteFilter> crossSiteFilter() {
        return first(new CrossSiteFilter(), 2);
    }

    @Bean
    FilterRegistrationBean<BodyBoundsFilter> bodyBoundsFilter(
            @Value("${server.tomcat.max-http-form-post-size}") DataSize form,
            @Value("${spring.servlet.multipart.max-request-size}") DataSize upload) {
        return first(new BodyBoundsFilter(form, upload), 3);
    }

    private static <T extends Filter> FilterRegistrationBean<T> first(T filter, int place) {
        FilterRegistrationBean<T> registration = new FilterRegistrationBean<>(filter);
        registration.setOrder(Ordered.HIGHEST_PRECEDENCE + place);
        return registration;
    }

    @Bean
    SecurityFilterChain pages(HttpSecurity http) {
        return http.csrf(forms -> forms.csrfTokenRepository(formTokens()))
                .sessionManagement(sessions -> sessions.sessionCreationPolicy(SessionCreationPolicy.STATELESS))
                .requestCache(AbstractHttpConfigurer::disable)
                .logout(AbstractHttpConfigurer::disable)
                // PageHeadersFilter writes them, on refusals before this chain as well.
                .headers(AbstractHttpConfigurer::disable)
                .authorizeHttpRequests(asked -> asked.dispatcherTypeMatchers(DispatcherType.ERROR)
                        .permitAll()
                        .requestMatchers("/actuator/health")
                        .permitAll()
                        .requestMatchers("/actuator/**")
                        .denyAll()
                        .anyRequest()
                        .permitAll())
                .exceptionHandling(refused -> refused.accessDeniedHandler(new FormTokenRefusal())
                        .authenticationEntryPoint(
                                (request, response, nobody) -> response.sendError(HttpServletResponse.SC_FORBIDDEN)))
                .build();
    }

    private static CookieCsrfTokenRepository formTokens() {
        CookieCsrfTokenRepository tokens = new CookieCsrfTokenRepository();
        tokens.setCookieName(FORM_TOKEN_COOKIE);
        tokens.setCookiePath("/");
        tokens.setCookieCustomizer(cookie -> cookie.sameSite("Strict").httpOnly(true));
        return tokens;
    }
}
