package freshet.deployment;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.InstanceOfAssertFactories.list;

import io.fabric8.kubernetes.api.model.Container;
import io.fabric8.kubernetes.api.model.ContainerPort;
import io.fabric8.kubernetes.api.model.HTTPGetAction;
import io.fabric8.kubernetes.api.model.HasMetadata;
import io.fabric8.kubernetes.api.model.IntOrString;
import io.fabric8.kubernetes.api.model.LabelSelector;
import io.fabric8.kubernetes.api.model.PodSpec;
import io.fabric8.kubernetes.api.model.PodTemplateSpec;
import io.fabric8.kubernetes.api.model.Probe;
import io.fabric8.kubernetes.api.model.Service;
import io.fabric8.kubernetes.api.model.ServicePort;
import io.fabric8.kubernetes.api.model.TopologySpreadConstraint;
import io.fabric8.kubernetes.api.model.VolumeMount;
import io.fabric8.kubernetes.api.model.apps.Deployment;
import io.fabric8.kubernetes.api.model.autoscaling.v2.CrossVersionObjectReference;
import io.fabric8.kubernetes.api.model.autoscaling.v2.HorizontalPodAutoscaler;
import io.fabric8.kubernetes.api.model.networking.v1.NetworkPolicy;
import io.fabric8.kubernetes.api.model.networking.v1.NetworkPolicyPort;
import io.fabric8.kubernetes.api.model.policy.v1.PodDisruptionBudget;
import io.fabric8.kubernetes.client.utils.KubernetesSerialization;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.xml.xpath.XPathFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.springframework.boot.convert.DurationStyle;
import org.springframework.boot.env.YamlPropertySourceLoader;
import org.springframework.core.env.MutablePropertySources;
import org.springframework.core.env.PropertyResolver;
import org.springframework.core.env.PropertySource;
import org.springframework.core.env.PropertySourcesPropertyResolver;
import org.springframework.core.io.FileSystemResource;
import org.xml.sax.InputSource;
import tools.jackson.databind.DeserializationFeature;
import tools.jackson.databind.cfg.MapperConfig;
import tools.jackson.databind.introspect.Annotated;
import tools.jackson.databind.introspect.JacksonAnnotationIntrospector;
import tools.jackson.databind.json.JsonMapper;

/** The manifests are well formed, and say the same as the application, its image and its build. */
class KubernetesManifestsTest {

    private static final String KUSTOMIZATION = "kustomization.yaml";
    private static final KubernetesSerialization YAML = strictYaml();

    private final Deployment deployment = manifest("deployment.yaml", Deployment.class);
    private final Service service = manifest("service.yaml", Service.class);
    private final HorizontalPodAutoscaler autoscaler =
            manifest("horizontal-pod-autoscaler.yaml", HorizontalPodAutoscaler.class);
    private final PodDisruptionBudget budget = manifest("pod-disruption-budget.yaml", PodDisruptionBudget.class);
    private final NetworkPolicy policy = manifest("network-policy.yaml", NetworkPolicy.class);
    private final PodTemplateSpec template = deployment.getSpec().getTemplate();
    private final PodSpec pod = template.getSpec();
    private final Container container = pod.getContainers().get(0);
    private final PropertyResolver application = application();

    KubernetesManifestsTest() throws IOException {}

    @ParameterizedTest
    @MethodSource("manifests")
    void everyManifestHasOnlyKnownFields(String file) throws IOException {
        HasMetadata resource = manifest(file, HasMetadata.class);

        assertThat(resource.getMetadata().getName()).isEqualTo("freshet");
    }

    @ParameterizedTest
    @ValueSource(strings = {"replicas", "matchLabels", "containerPort", "failureThreshold", "readOnlyRootFilesystem"})
    void unknownFieldIsFoundAtAnyDepth(String field) throws IOException {
        String misspelled = read("k8s/deployment.yaml").replace(field + ":", field + "z:");

        assertThatThrownBy(() -> YAML.unmarshal(misspelled)).hasStackTraceContaining("\"" + field + "z\"");
    }

    @Test
    void kustomizationListsEveryManifest() throws IOException {
        Map<?, ?> kustomization = YAML.unmarshal(read("k8s/" + KUSTOMIZATION), Map.class);

        assertThat(kustomization.get("resources"))
                .asInstanceOf(list(String.class))
                .containsExactlyInAnyOrderElementsOf(manifests().toList());
    }

    @Test
    void containerPortsAreThoseTheApplicationListensOn() {
        assertThat(container.getPorts())
                .extracting(ContainerPort::getContainerPort)
                .containsExactly(serverPort(), managementPort());
    }

    @Test
    void containerPortsAreNamed() {
        assertThat(portNames()).containsExactly("http", "management");
    }

    @Test
    void imageExposesThePortsOfTheApplication() throws IOException {
        assertThat(instruction("EXPOSE")).isEqualTo(serverPort() + " " + managementPort());
    }

    @Test
    void imageAsksItsOwnHealthOnThePortOfTheApplication() throws IOException {
        assertThat(read("Dockerfile")).contains("/dev/tcp/127.0.0.1/" + serverPort(), "GET /readyz ");
    }

    @Test
    void probesAskThePortOfTheApplication() {
        assertThat(probes())
                .extracting(HTTPGetAction::getPort)
                .extracting(IntOrString::getStrVal)
                .containsOnly("http");
    }

    @Test
    void probesAskPathsThatTheApplicationServes() {
        assertThat(application.getProperty("management.endpoint.health.probes.add-additional-paths"))
                .isEqualTo("true");
        assertThat(probes()).extracting(HTTPGetAction::getPath).containsExactly("/livez", "/livez", "/readyz");
    }

    @Test
    void metricsAreScrapedFromTheManagementPort() {
        assertThat(template.getMetadata().getAnnotations())
                .containsEntry("prometheus.io/port", Integer.toString(managementPort()))
                .containsEntry("prometheus.io/path", "/actuator/prometheus");
        assertThat(application.getProperty("management.endpoints.web.exposure.include"))
                .contains("prometheus");
    }

    @Test
    void containerRunsAsTheUserOfTheImage() throws IOException {
        assertThat(pod.getSecurityContext().getRunAsNonRoot()).isTrue();
        assertThat(instruction("USER"))
                .isEqualTo(pod.getSecurityContext().getRunAsUser() + ":"
                        + pod.getSecurityContext().getRunAsGroup());
    }

    @Test
    void containerIsRestricted() {
        assertThat(container.getSecurityContext().getAllowPrivilegeEscalation()).isFalse();
        assertThat(container.getSecurityContext().getCapabilities().getDrop()).containsExactly("ALL");
        assertThat(pod.getSecurityContext().getSeccompProfile().getType()).isEqualTo("RuntimeDefault");
        assertThat(pod.getAutomountServiceAccountToken()).isFalse();
    }

    @Test
    void containerWritesToNothingButItsTemporaryDirectory() {
        assertThat(container.getSecurityContext().getReadOnlyRootFilesystem()).isTrue();
        assertThat(container.getVolumeMounts())
                .extracting(VolumeMount::getMountPath)
                .containsExactly("/tmp");
        assertThat(pod.getVolumes())
                .allSatisfy(volume -> assertThat(volume.getEmptyDir()).isNotNull());
    }

    @Test
    void deploymentNamesTheImageOfThisVersion() throws Exception {
        assertThat(container.getImage()).isEqualTo("freshet:" + projectVersion());
        assertThat(read("Dockerfile")).contains("ARG VERSION=" + projectVersion() + "\n");
    }

    @Test
    void imageRunsWithTheFlagsItsCacheWasMadeWith() throws IOException {
        assertThat(read("Dockerfile").lines().filter(line -> line.contains("-XX:AOTCache")))
                .hasSize(3)
                .allSatisfy(line -> assertThat(line).contains("@jvm.options"));
    }

    @Test
    void podIsGivenTheTimeThatRequestsInFlightAreGiven() {
        long waiting = container.getLifecycle().getPreStop().getSleep().getSeconds();
        String phase = application.getProperty("spring.lifecycle.timeout-per-shutdown-phase", "30s");
        Duration needed = DurationStyle.detectAndParse(phase).plusSeconds(waiting);

        assertThat(Duration.ofSeconds(pod.getTerminationGracePeriodSeconds())).isGreaterThan(needed);
    }

    @Test
    void servicePointsAtPortsOfThePods() {
        assertThat(service.getSpec().getPorts())
                .extracting(ServicePort::getTargetPort)
                .extracting(IntOrString::getStrVal)
                .isSubsetOf(portNames());
    }

    @Test
    void everySelectorMatchesThePods() {
        List<Map<String, String>> selectors = new ArrayList<>();
        selectors.add(service.getSpec().getSelector());
        selectorsOfLabels().map(LabelSelector::getMatchLabels).forEach(selectors::add);

        assertThat(selectors)
                .allSatisfy(selector -> assertThat(template.getMetadata().getLabels())
                        .containsAllEntriesOf(selector)
                        .isNotEmpty());
        assertThat(selectors).doesNotContain(Map.of());
    }

    @Test
    void autoscalerScalesTheDeployment() {
        CrossVersionObjectReference target = autoscaler.getSpec().getScaleTargetRef();

        assertThat(target.getApiVersion()).isEqualTo(deployment.getApiVersion());
        assertThat(target.getKind()).isEqualTo(deployment.getKind());
        assertThat(target.getName()).isEqualTo(deployment.getMetadata().getName());
    }

    @Test
    void deploymentStartsWithTheAutoscalersMinimum() {
        assertThat(deployment.getSpec().getReplicas())
                .isEqualTo(autoscaler.getSpec().getMinReplicas())
                .isGreaterThanOrEqualTo(2);
    }

    @Test
    void podsMayBeEvictedOneAtATime() {
        assertThat(budget.getSpec().getMaxUnavailable().getIntVal()).isEqualTo(1);
    }

    @Test
    void nothingLeavesThePods() {
        assertThat(policy.getSpec().getPolicyTypes()).containsExactly("Ingress", "Egress");
        assertThat(policy.getSpec().getEgress()).isEmpty();
    }

    @Test
    void onlyPortsOfThePodsAreOpened() {
        assertThat(policy.getSpec().getIngress())
                .flatMap(rule -> rule.getPorts())
                .extracting(NetworkPolicyPort::getPort)
                .extracting(IntOrString::getStrVal)
                .containsExactlyElementsOf(portNames());
    }

    @Test
    void metricsAreOpenToAMonitoringNamespaceOnly() {
        assertThat(policy.getSpec().getIngress().get(1).getFrom())
                .extracting(peer -> peer.getNamespaceSelector().getMatchLabels())
                .containsExactly(Map.of("purpose", "monitoring"));
    }

    private Stream<LabelSelector> selectorsOfLabels() {
        return Stream.concat(
                Stream.of(
                        deployment.getSpec().getSelector(),
                        budget.getSpec().getSelector(),
                        policy.getSpec().getPodSelector()),
                pod.getTopologySpreadConstraints().stream().map(TopologySpreadConstraint::getLabelSelector));
    }

    private List<HTTPGetAction> probes() {
        return Stream.of(container.getStartupProbe(), container.getLivenessProbe(), container.getReadinessProbe())
                .map(Probe::getHttpGet)
                .toList();
    }

    private List<String> portNames() {
        return container.getPorts().stream().map(ContainerPort::getName).toList();
    }

    private int serverPort() {
        return application.getRequiredProperty("server.port", Integer.class);
    }

    private int managementPort() {
        return application.getRequiredProperty("management.server.port", Integer.class);
    }

    private static Stream<String> manifests() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("k8s"))) {
            List<String> names =
                    files.map(file -> file.getFileName().toString()).sorted().toList();
            return names.stream().filter(name -> !name.equals(KUSTOMIZATION));
        }
    }

    private static <T extends HasMetadata> T manifest(String file, Class<T> type) throws IOException {
        Object resource = YAML.unmarshal(read("k8s/" + file));
        assertThat(resource).isInstanceOf(type);
        return type.cast(resource);
    }

    private static String instruction(String name) throws IOException {
        List<String> found = read("Dockerfile")
                .lines()
                .filter(line -> line.startsWith(name + " "))
                .toList();
        assertThat(found).hasSize(1);
        return found.get(0).substring(name.length() + 1);
    }

    private static PropertyResolver application() throws IOException {
        FileSystemResource file = new FileSystemResource("src/main/resources/application.yaml");
        MutablePropertySources sources = new MutablePropertySources();
        for (PropertySource<?> source : new YamlPropertySourceLoader().load("application", file)) {
            sources.addLast(source);
        }
        return new PropertySourcesPropertyResolver(sources);
    }

    private static String projectVersion() throws Exception {
        try (var pom = Files.newInputStream(Path.of("pom.xml"))) {
            return XPathFactory.newInstance()
                    .newXPath()
                    .evaluate("/*[local-name()='project']/*[local-name()='version']", new InputSource(pom));
        }
    }

    private static String read(String file) throws IOException {
        return Files.readString(Path.of(file));
    }

    private static KubernetesSerialization strictYaml() {
        JsonMapper mapper = JsonMapper.builder()
                .annotationIntrospector(new KnownFieldsOnly())
                .enable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
                .build();
        return new KubernetesSerialization(mapper, true);
    }

    /** Keeps the models from collecting the fields that they don't know, so that such a field is an error. */
    private static final class KnownFieldsOnly extends JacksonAnnotationIntrospector {

        @Override
        public Boolean hasAnySetter(MapperConfig<?> configuration, Annotated member) {
            return false;
        }
    }
}
