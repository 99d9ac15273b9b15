package freshet.quantity;

import java.lang.annotation.ElementType;
import java.lang.annotation.Repeatable;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Of these inputs at most one may be given. */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@Repeatable(AtMostOneOf.List.class)
public @interface AtMostOneOf {

    /** Names of the inputs. */
    String[] value();

    /** Several groups of one request. */
    @Target(ElementType.TYPE)
    @Retention(RetentionPolicy.RUNTIME)
    @interface List {

        /** The groups. */
        AtMostOneOf[] value();
    }
}
