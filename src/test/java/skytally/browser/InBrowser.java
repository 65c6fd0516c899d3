package skytally.browser;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.extension.ExtendWith;

/**
 * A test that needs a real browser. Without one it is skipped and says so, unless the system property
 * {@code skytally.browser.required} is true: then it fails.
 *
 * <pre>
 *   &#64;InBrowser
 *   &#64;SpringBootTest(webEnvironment = RANDOM_PORT)
 *   class SomePageBrowserTest {
 *
 *       &#64;LocalServerPort
 *       private int port;
 *
 *       &#64;Test
 *       void showsSomething() {
 *           try (Browser browser = Browser.on(port)) {
 *               browser.open("/some?count=24");
 *               browser.screenshot("some-page", 1280);
 *               assertThat(browser.accessibilityFaults()).isEmpty();
 *           }
 *       }
 *   }
 * </pre>
 */
@Target({ElementType.TYPE, ElementType.METHOD})
@Retention(RetentionPolicy.RUNTIME)
@Tag("browser")
@ExtendWith(BrowserCondition.class)
public @interface InBrowser {}
