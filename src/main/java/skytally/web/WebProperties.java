package skytally.web;

import java.util.List;
import org.springframework.boot.context.properties.ConfigurationProperties;
import org.springframework.boot.context.properties.bind.DefaultValue;

/**
 * How the pages may be reached.
 *
 * @param hostNames names, beside localhost, by which a browser may ask for them, without a port
 */
@ConfigurationProperties("skytally.web")
record WebProperties(@DefaultValue List<String> hostNames) {}
