package skytally.web;

import org.springframework.context.annotation.Configuration;
import org.springframework.http.MediaType;
import org.springframework.web.servlet.config.annotation.ContentNegotiationConfigurer;
import org.springframework.web.servlet.config.annotation.WebMvcConfigurer;

/** An address that answers both people and programs answers a person unless it is asked for data. */
@Configuration(proxyBeanMethods = false)
class ContentWiring implements WebMvcConfigurer {

    @Override
    public void configureContentNegotiation(ContentNegotiationConfigurer negotiation) {
        negotiation.defaultContentType(MediaType.TEXT_HTML, MediaType.ALL);
    }
}
