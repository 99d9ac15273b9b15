package freshet.catalogue;

import freshet.http.problem.Problem;
import freshet.http.problem.ProblemException;
import freshet.http.problem.ProblemType;
import io.swagger.v3.oas.annotations.Hidden;
import io.swagger.v3.oas.annotations.media.Schema;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.springframework.http.ResponseEntity;
import org.springframework.util.MultiValueMap;
import org.springframework.web.bind.annotation.GetMapping;
import org.springframework.web.bind.annotation.PathVariable;
import org.springframework.web.bind.annotation.RequestParam;
import org.springframework.web.bind.annotation.RestController;

/** What each kind of problem means. */
@Hidden
@RestController
class ProblemsController {

    @Schema(name = "ProblemType", description = "A kind of problem")
    record ProblemPage(
            @Schema(description = "Its address, as the member type of a problem holds it")
            String type,

            @Schema(description = "One line") String title,
            @Schema(description = "The usual HTTP status") int status,

            @Schema(description = "What leads to it and how to mend it")
            String explanation) {

        static ProblemPage of(ProblemType type) {
            return new ProblemPage("/problems/" + type.id(), type.title(), type.status(), type.explanation());
        }
    }

    @GetMapping("/problems")
    ResponseEntity<byte[]> list(@RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        List<ProblemPage> pages =
                Arrays.stream(ProblemType.values()).map(ProblemPage::of).toList();
        return Page.json(Map.of("items", pages));
    }

    @GetMapping("/problems/{id}")
    ResponseEntity<byte[]> one(@PathVariable String id, @RequestParam MultiValueMap<String, String> query) {
        QueryCheck.only(query);
        return Page.json(Arrays.stream(ProblemType.values())
                .filter(type -> type.id().equals(id))
                .findFirst()
                .map(ProblemPage::of)
                .orElseThrow(() -> new ProblemException(Problem.of(
                        ProblemType.NOT_FOUND, "There is no problem of this id; GET /problems lists all of them."))));
    }
}
