package skytally.web;

import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.time.Duration;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.springframework.context.annotation.Configuration;
import org.springframework.core.MethodParameter;
import org.springframework.http.HttpHeaders;
import org.springframework.http.ResponseCookie;
import org.springframework.web.bind.support.WebDataBinderFactory;
import org.springframework.web.context.request.NativeWebRequest;
import org.springframework.web.method.support.HandlerMethodArgumentResolver;
import org.springframework.web.method.support.ModelAndViewContainer;
import org.springframework.web.servlet.HandlerInterceptor;
import org.springframework.web.servlet.config.annotation.InterceptorRegistry;
import org.springframework.web.servlet.config.annotation.WebMvcConfigurer;

/** Lets a controller ask for {@link Switches} or the {@link SwitchBoard} as an argument, and remembers the theme a person switched to. */
@Configuration(proxyBeanMethods = false)
class SwitchesWiring implements WebMvcConfigurer {

    @Override
    public void addArgumentResolvers(List<HandlerMethodArgumentResolver> resolvers) {
        resolvers.add(new SwitchesArgument());
    }

    @Override
    public void addInterceptors(InterceptorRegistry registry) {
        registry.addInterceptor(new ThemeMemory()).excludePathPatterns("/error");
    }

    private static final class SwitchesArgument implements HandlerMethodArgumentResolver {

        @Override
        public boolean supportsParameter(MethodParameter parameter) {
            return parameter.getParameterType() == Switches.class || parameter.getParameterType() == SwitchBoard.class;
        }

        @Override
        public Object resolveArgument(
                MethodParameter parameter,
                @Nullable ModelAndViewContainer page,
                NativeWebRequest request,
                @Nullable WebDataBinderFactory binders) {
            HttpServletRequest asked = request.getNativeRequest(HttpServletRequest.class);
            if (asked == null) {
                throw new IllegalStateException("Switches are read from an HTTP request");
            }
            return parameter.getParameterType() == Switches.class ? Switches.of(asked) : SwitchBoard.of(asked);
        }
    }

    /** A theme in a quoted address holds for that page; only one chosen on a page of ours is remembered. */
    private static final class ThemeMemory implements HandlerInterceptor {

        private static final Duration REMEMBERED = Duration.ofDays(365);

        @Override
        public boolean preHandle(HttpServletRequest request, HttpServletResponse response, Object handler) {
            String site = request.getHeader("Sec-Fetch-Site");
            if (request.getMethod().equals("GET") && (site == null || site.equals("same-origin"))) {
                Switches.themeAsked(request)
                        .ifPresent(theme -> response.addHeader(
                                HttpHeaders.SET_COOKIE,
                                ResponseCookie.from(Switches.THEME_COOKIE, theme.word())
                                        .path("/")
                                        .httpOnly(true)
                                        .sameSite("Lax")
                                        .maxAge(REMEMBERED)
                                        .build()
                                        .toString()));
            }
            return true;
        }
    }
}
