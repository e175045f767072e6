package clipramp.circuit;

import java.lang.reflect.Constructor;
import java.lang.reflect.RecordComponent;
import java.util.Optional;

/** Records with one component changed, however deep: what a test of one margin or one sensitivity needs. */
public final class Changed {
    private Changed() {}

    /**
     * A copy of a record with another value at a path of component names, such as "trigger.device.limits.watts". An
     * Optional on the way is looked into; the last component is replaced as it is.
     */
    public static <T> T with(T root, String path, Object value) {
        int dot = path.indexOf('.');
        String name = dot < 0 ? path : path.substring(0, dot);
        try {
            RecordComponent[] components = root.getClass().getRecordComponents();
            Object[] values = new Object[components.length];
            Class<?>[] types = new Class<?>[components.length];
            boolean found = false;
            for (int i = 0; i < components.length; i++) {
                types[i] = components[i].getType();
                values[i] = components[i].getAccessor().invoke(root);
                if (components[i].getName().equals(name)) {
                    found = true;
                    values[i] = dot < 0 ? value : deeper(values[i], path.substring(dot + 1), value);
                }
            }
            if (!found) {
                throw new IllegalArgumentException(root.getClass().getSimpleName() + " has no " + name);
            }
            @SuppressWarnings("unchecked")
            Constructor<T> constructor = (Constructor<T>) root.getClass().getDeclaredConstructor(types);
            return constructor.newInstance(values);
        } catch (ReflectiveOperationException e) {
            throw new IllegalArgumentException(path, e);
        }
    }

    private static Object deeper(Object inner, String path, Object value) {
        return inner instanceof Optional<?> optional
                ? Optional.of(with(optional.orElseThrow(), path, value))
                : with(inner, path, value);
    }
}
