/** The OpenAPI document, made from the same declarations that answer requests. */
@NullMarked
package freshet.catalogue.openapi;

import org.jspecify.annotations.NullMarked;
