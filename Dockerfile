# The bases are arguments, so that an image can be built from a mirror or from bases of one's own.
ARG BUILD_BASE=maven:3-eclipse-temurin-25
ARG RUN_BASE=eclipse-temurin:25-jre

FROM ${BUILD_BASE} AS build
WORKDIR /build
COPY .mvn .mvn
COPY pom.xml pom.xml
COPY src/main src/main
# Tests and formatting are judged before an image is built, so the context holds no test.
RUN --mount=type=cache,target=/maven-repository \
    mvn --batch-mode --no-transfer-progress -Dmaven.repo.local=/maven-repository \
        -DskipTests -Dspotless.check.skip=true package
# One directory for each layer, the libraries apart from the application: they change far less often.
RUN java -Djarmode=tools -jar target/freshet-*.jar extract --layers --application-filename freshet.jar \
        --destination layers

FROM ${RUN_BASE}
ARG VERSION=0.1.0
LABEL org.opencontainers.image.title="Freshet" \
      org.opencontainers.image.description="Nitrogen water chemistry of fish farms and aquaponic greenhouses, answered over HTTP." \
      org.opencontainers.image.licenses="Apache-2.0" \
      org.opencontainers.image.version="${VERSION}"
RUN groupadd --gid 10001 freshet \
    && useradd --uid 10001 --gid 10001 --no-create-home --home-dir /nonexistent --shell /usr/sbin/nologin freshet
WORKDIR /application
COPY --from=build /build/layers/dependencies/ ./
COPY --from=build /build/layers/spring-boot-loader/ ./
COPY --from=build /build/layers/snapshot-dependencies/ ./
COPY --from=build /build/layers/application/ ./
# The training run and the service read their flags from one file: a JVM that lays out objects otherwise (another
# collector or other headers may) starts without the cache. Compressed pointers are spelled out since a build machine
# with much memory would leave them off.
RUN printf '%s\n' -XX:+UseSerialGC -XX:+UseCompressedOops -XX:MaxRAMPercentage=60 -XX:+ExitOnOutOfMemoryError \
        -XX:-UsePerfData > jvm.options
# The second run is there to fail: with AOTMode=on a cache that the service couldn't use ends the build. Both leave
# Tomcat's directories behind.
RUN java @jvm.options -XX:AOTCacheOutput=app.aot -Dspring.context.exit=onRefresh -jar freshet.jar \
    && java @jvm.options -XX:AOTCache=app.aot -XX:AOTMode=on -Dspring.context.exit=onRefresh -jar freshet.jar \
    && chmod 0444 app.aot \
    && rm -rf /tmp/*
# A number, since Kubernetes can't tell from a name that the user isn't root. It owns nothing and can write to /tmp only.
USER 10001:10001
EXPOSE 8080 8081
# Bash opens the connection itself: a runtime image needn't have a client for HTTP.
HEALTHCHECK --interval=10s --timeout=3s --start-period=30s --retries=3 \
    CMD ["bash", "-c", "exec 3<>/dev/tcp/127.0.0.1/8080 && printf 'GET /readyz HTTP/1.0\\r\\n\\r\\n' >&3 && read -r status <&3 && [[ $status == 'HTTP/1.'?' 200'* ]]"]
ENTRYPOINT ["java", "@jvm.options", "-XX:AOTCache=app.aot", "-jar", "freshet.jar"]
