package freshet.catalogue;

import freshet.answer.Fault;
import freshet.answer.FaultCode;
import freshet.answer.Refusal;
import freshet.http.Calculation;
import freshet.http.Calculations;
import freshet.http.binding.Names;
import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import freshet.method.Method;
import io.swagger.v3.oas.annotations.Hidden;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.springframework.http.ResponseEntity;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;

/** The catalogue of methods. */
@Hidden
@RestController
class MethodsController {

    private static final String FILTER = "calculation";

    private final Calculations calculations;

    MethodsController(Calculations calculations) {
        this.calculations = calculations;
    }

    @GetMapping("/v1/methods")
    ResponseEntity<byte[]> list(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query, FILTER);
        Optional<String> wanted = Optional.ofNullable(query.getFirst(FILTER));
        wanted.ifPresent(this::checkKnown);
        List<MethodPage> methods = Methods.all().stream()
                .map(this::page)
                .filter(page -> wanted.isEmpty() || page.calculations().contains(wanted.get()))
                .toList();
        return Page.json(Map.of("items", methods));
    }

    @GetMapping("/v1/methods/{id}")
    ResponseEntity<byte[]> one(@PathVariable String id, @RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        List<String> ids = Methods.all().stream().map(Method::id).toList();
        return Page.json(Methods.withId(id)
                .map(this::page)
                .orElseThrow(() -> new ProblemException(Problem.of(
                        ProblemType.NOT_FOUND,
                        "There is no method of this id"
                                + Names.nearest(id.replace('-', '_'), ids)
                                        .map(near -> "; did you mean " + near + "?")
                                        .orElse("; GET /v1/methods lists all of them.")))));
    }

    private void checkKnown(String path) {
        List<String> paths =
                calculations.all().stream().map(Calculation::path).sorted().toList();
        if (!paths.contains(path)) {
            throw new Refusal(new Fault(
                            FILTER,
                            FaultCode.NOT_ALLOWED,
                            "There is no such calculation; allowed are " + String.join(", ", paths) + ".")
                    .allowing(paths)
                    .near(Names.nearest(path, paths)));
        }
    }

    private MethodPage page(Method method) {
        TreeSet<String> users = new TreeSet<>();
        calculations.all().stream()
                .filter(calculation -> calculation.methods().stream().anyMatch(used -> restsOn(used, method)))
                .forEach(calculation -> users.add(calculation.path()));
        return MethodPage.of(method, new ArrayList<>(users));
    }

    private static boolean restsOn(Method user, Method part) {
        return user.equals(part)
                || user.uses().stream()
                        .flatMap(id -> Methods.withId(id).stream())
                        .anyMatch(used -> restsOn(used, part));
    }
}
