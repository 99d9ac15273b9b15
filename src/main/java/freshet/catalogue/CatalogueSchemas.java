package freshet.catalogue;

import freshet.catalogue.ConstantsController.ConstantsPage;
import freshet.catalogue.ProblemsController.ProblemPage;
import io.swagger.v3.core.converter.ModelConverters;
import io.swagger.v3.oas.models.media.Schema;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Schemas of the catalogue's own pages. */
public final class CatalogueSchemas {

    @io.swagger.v3.oas.annotations.media.Schema(name = "Methods", description = "Methods by id")
    private record MethodList(List<MethodPage> items) {}

    @io.swagger.v3.oas.annotations.media.Schema(name = "ProblemTypes", description = "Kinds of problems")
    private record ProblemList(List<ProblemPage> items) {}

    private CatalogueSchemas() {}

    /** By name. */
    public static Map<String, Schema<?>> all() {
        Map<String, Schema<?>> schemas = new TreeMap<>();
        for (Class<?> page : List.of(MethodList.class, ConstantsPage.class, ProblemList.class)) {
            ModelConverters.getInstance(true).readAll(page).forEach(schemas::put);
        }
        return schemas;
    }
}
