package freshet.http.binding;

import freshet.quantity.Alternative;
import freshet.quantity.Choice;
import freshet.quantity.Default;
import freshet.quantity.Flag;
import freshet.quantity.Quantity;
import freshet.quantity.Unit;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import jakarta.validation.constraints.NotNull;
import java.lang.annotation.Annotation;
import java.lang.reflect.AnnotatedType;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Reads the declaration of one input from a component of a request record. */
final class InputReader {

    private final RecordComponent component;
    private final int index;
    private final String name;
    private @Nullable Annotation quantity;
    private String meaning = "";
    private final boolean required;
    private Optional<String> defaultText = Optional.empty();

    private InputReader(RecordComponent component, String prefix, int index) {
        this.component = component;
        this.index = index;
        this.name = prefix + Names.snake(component.getName());
        for (Annotation annotation : component.getAnnotations()) {
            note(annotation);
        }
        AnnotatedType type = component.getAnnotatedType();
        for (Annotation annotation : type.getAnnotations()) {
            if (!(annotation instanceof NotNull) && !(annotation instanceof Nullable)) {
                throw unread(annotation);
            }
        }
        required = type.isAnnotationPresent(NotNull.class);
        if (!required && defaultText.isEmpty() && !type.isAnnotationPresent(Nullable.class)) {
            throw new IllegalStateException("Input " + name + " is neither required nor optional nor has a default");
        }
    }

    static Input read(RecordComponent component, String prefix, int index) {
        InputReader reader = new InputReader(component, prefix, index);
        return reader.quantity == null ? reader.plain() : reader.number(reader.quantity.annotationType());
    }

    private void note(Annotation annotation) {
        if (annotation instanceof Default value) {
            defaultText = Optional.of(value.value());
        } else if (annotation instanceof Choice choice) {
            meaning = choice.value();
        } else if (annotation instanceof Flag flag) {
            meaning = flag.value();
        } else if (annotation.annotationType().isAnnotationPresent(Quantity.class)) {
            quantity = annotation;
        } else {
            throw unread(annotation);
        }
    }

    private IllegalStateException unread(Annotation annotation) {
        return new IllegalStateException("Input " + name + " bears an annotation that no one reads: " + annotation);
    }

    private Input number(Class<? extends Annotation> type) {
        Quantity declared = type.getAnnotation(Quantity.class);
        Input.Kind kind = component.getType() == Integer.class ? Input.Kind.WHOLE : Input.Kind.NUMBER;
        String own = ownWording(type);
        return new Input(
                index,
                kind,
                own.isEmpty() ? declared.wording() : own,
                declared.example(),
                Double.parseDouble(type.getAnnotation(DecimalMin.class).value()),
                Double.parseDouble(type.getAnnotation(DecimalMax.class).value()),
                required,
                defaultText,
                spellings(type, declared.unit()),
                Map.of());
    }

    private Input plain() {
        boolean flag = component.getType() == Boolean.class;
        Map<String, Object> choices = choices();
        if (meaning.isEmpty() || flag != choices.isEmpty()) {
            throw new IllegalStateException("Input " + name + " is neither a quantity nor a choice nor a flag");
        }
        return new Input(
                index,
                flag ? Input.Kind.FLAG : component.getType() == List.class ? Input.Kind.LIST : Input.Kind.CHOICE,
                meaning,
                flag ? "true" : choices.keySet().iterator().next(),
                Double.NaN,
                Double.NaN,
                required,
                defaultText,
                List.of(new Spelling(name, Unit.ONE, 1, 0)),
                choices);
    }

    private List<Spelling> spellings(Class<? extends Annotation> type, Unit unit) {
        List<Spelling> spellings = new ArrayList<>();
        spellings.add(new Spelling(name, unit, 1, 0));
        for (Alternative other : type.getAnnotationsByType(Alternative.class)) {
            if (name.contains(other.replacing())) {
                String spelled = name.replace(other.replacing(), other.by());
                spellings.add(new Spelling(spelled, other.unit(), other.factor(), other.offset()));
            }
        }
        return List.copyOf(spellings);
    }

    private String ownWording(Class<? extends Annotation> type) {
        try {
            return (String) type.getMethod("value").invoke(quantity);
        } catch (ReflectiveOperationException impossible) {
            throw new IllegalStateException(impossible);
        }
    }

    private Map<String, Object> choices() {
        Map<String, Object> choices = new LinkedHashMap<>();
        if (component.getType().isEnum()) {
            for (Object constant : component.getType().getEnumConstants()) {
                choices.put(Names.kebab((Enum<?>) constant), constant);
            }
        } else if (component.getGenericType() instanceof ParameterizedType list
                && list.getActualTypeArguments()[0] instanceof Class<?> element
                && element.isEnum()) {
            for (Object constant : element.getEnumConstants()) {
                choices.put(((Enum<?>) constant).name().toLowerCase(Locale.ROOT), constant);
            }
        }
        return choices;
    }
}
