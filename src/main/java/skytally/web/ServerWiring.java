package skytally.web;

import org.apache.catalina.core.StandardHost;
import org.springframework.boot.tomcat.servlet.TomcatServletWebServerFactory;
import org.springframework.boot.web.server.WebServerFactoryCustomizer;
import org.springframework.stereotype.Component;

/** Has the server itself answer in our words where it answers without us. */
@Component
class ServerWiring implements WebServerFactoryCustomizer<TomcatServletWebServerFactory> {

    @Override
    public void customize(TomcatServletWebServerFactory server) {
        server.addContextCustomizers(context ->
                ((StandardHost) context.getParent()).setErrorReportValveClass(BareErrorPage.class.getName()));
    }
}
