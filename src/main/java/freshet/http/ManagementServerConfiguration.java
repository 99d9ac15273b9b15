package freshet.http;

import org.springframework.boot.actuate.autoconfigure.web.ManagementContextConfiguration;
import org.springframework.boot.actuate.autoconfigure.web.ManagementContextType;
import org.springframework.context.annotation.Import;

/** The management port has a server of its own, whose own answers follow the same rules. */
@ManagementContextConfiguration(value = ManagementContextType.CHILD, proxyBeanMethods = false)
@Import(ServerConfiguration.class)
class ManagementServerConfiguration {}
