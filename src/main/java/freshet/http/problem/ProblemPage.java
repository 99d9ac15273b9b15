package freshet.http.problem;

import jakarta.servlet.RequestDispatcher;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import org.springframework.boot.webmvc.error.ErrorController;
import org.springframework.stereotype.Controller;
import org.springframework.web.bind.annotation.RequestMapping;

/** The page for errors that were raised outside Spring MVC, for example by a filter. */
@Controller
class ProblemPage implements ErrorController {

    @RequestMapping("/error")
    void error(HttpServletRequest request, HttpServletResponse response) throws IOException {
        int status = request.getAttribute(RequestDispatcher.ERROR_STATUS_CODE) instanceof Integer code ? code : 404;
        if (status == HttpServletResponse.SC_METHOD_NOT_ALLOWED) {
            response.setHeader("Allow", "GET, HEAD, POST, OPTIONS");
        }
        Problems.send(Problem.ofStatus(status), request, response);
    }
}
