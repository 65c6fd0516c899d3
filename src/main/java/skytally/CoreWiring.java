package skytally;

import org.springframework.context.annotation.Bean;
import org.springframework.context.annotation.Configuration;
import skytally.assessment.Assessor;
import skytally.assessment.Circumstance;

/** Where Spring meets the plain Java of the core, and nowhere else. */
@Configuration(proxyBeanMethods = false)
class CoreWiring {

    @Bean
    Assessor assessor() {
        return new Assessor(Circumstance.EARLY_CLEAR);
    }
}
