package freshet.catalogue;

import freshet.catalogue.openapi.Example;
import freshet.http.Calculation;
import freshet.http.Calculations;
import io.swagger.v3.oas.annotations.Hidden;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.springframework.http.MediaType;
import org.springframework.http.ResponseEntity;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;
import org.springframework.web.servlet.support.ServletUriComponentsBuilder;
import org.springframework.web.util.HtmlUtils;

/** The first thing a person with curl sees. */
@Hidden
@RestController
class LandingController {

    private static final String HEAD = """
            Freshet: nitrogen water chemistry of fish farms and aquaponic greenhouses.
            GET with a query, or POST the same names as one JSON object. Every name ends in its unit.

            """;
    private static final String FOOT = """

            Every answer names its method and reference; add view=compact for controllers, strict=true to refuse inputs
            outside the range the source states. Faults come all at once, with bounds and units (see /problems).
            POST many rows (CSV, NDJSON, JSON items) to the same path with /series after it.
            /docs interactive   /openapi.yaml   /v1/methods sources and equations   /v1/constants molar masses
            Confirm by measurement before acting on fish or water; local codes and licensed practice decide.
            """;

    private final Calculations calculations;

    LandingController(Calculations calculations) {
        this.calculations = calculations;
    }

    @GetMapping(
            path = "/",
            produces = {MediaType.TEXT_PLAIN_VALUE, MediaType.ALL_VALUE})
    ResponseEntity<byte[]> text(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        return Page.text(plain());
    }

    @GetMapping(path = "/", produces = MediaType.APPLICATION_JSON_VALUE)
    ResponseEntity<byte[]> json(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        List<Map<String, String>> items = calculations.all().stream()
                .map(calculation -> {
                    Map<String, String> item = new LinkedHashMap<>();
                    item.put("path", calculation.address());
                    item.put("summary", calculation.summary());
                    item.put("example", example(calculation));
                    return item;
                })
                .toList();
        return Page.json(Map.of("items", items));
    }

    @GetMapping(path = "/", produces = MediaType.TEXT_HTML_VALUE)
    ResponseEntity<byte[]> html(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        String items = calculations.all().stream()
                .map(calculation -> "<dt><a href=\"%s\">%s</a></dt><dd>%s</dd>\n"
                        .formatted(
                                HtmlUtils.htmlEscape(example(calculation)),
                                calculation.path(),
                                HtmlUtils.htmlEscape(calculation.summary())))
                .collect(Collectors.joining());
        return Page.html("""
                <!doctype html>
                <html lang="en"><head><meta charset="utf-8"><title>Freshet</title>
                <meta name="viewport" content="width=device-width"></head>
                <body><h1>Freshet</h1><p>%s</p><dl>%s</dl><pre>%s</pre>
                <p><a href="/docs">Interactive documentation</a></p></body></html>
                """.formatted(HtmlUtils.htmlEscape(HEAD), items, HtmlUtils.htmlEscape(FOOT)));
    }

    private String plain() {
        String base = ServletUriComponentsBuilder.fromCurrentContextPath().toUriString();
        return HEAD
                + calculations.all().stream()
                        .map(calculation -> line(base, calculation))
                        .collect(Collectors.joining())
                + FOOT;
    }

    private static String example(Calculation<?, ?> calculation) {
        return calculation.inputs().flat()
                ? calculation.address() + "?" + calculation.example()
                : "POST " + calculation.address() + " " + Example.json(calculation);
    }

    private static String line(String base, Calculation<?, ?> calculation) {
        return calculation.inputs().flat()
                ? "curl '" + base + calculation.address() + "?" + calculation.example() + "'\n"
                : "curl '" + base + calculation.address() + "' -H 'Content-Type: application/json' -d '"
                        + Example.json(calculation) + "'\n";
    }
}
