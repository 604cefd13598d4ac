package io.github.gammawright.verification;

import io.github.gammawright.geometry.Quantity;
import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;

/** A kernel class as its users see it, by reflection. Whatever deviates from the promised shape is a {@link Defect}. */
final class KernelInstance {

    private final Class<?> type;
    private final boolean single;
    private final Method evaluate;

    /** The class breaks a promise that all kernel classes make. */
    static final class Defect extends Exception {
        Defect(String message) {
            super(message);
        }

        Defect(String message, Throwable cause) {
            super(message + ": " + cause, cause);
        }
    }

    /**
     * Looks at a class.
     *
     * @param arrays how many arrays {@code evaluate} must take
     */
    KernelInstance(Class<?> type, boolean single, int arrays) throws Defect {
        this.type = type;
        this.single = single;
        List<Method> methods = Arrays.stream(type.getMethods())
                .filter(method -> method.getName().equals("evaluate"))
                .toList();
        if (methods.size() != 1) {
            throw new Defect("there must be one method evaluate, not " + methods.size());
        }
        evaluate = methods.get(0);
        Class<?>[] expected = new Class<?>[arrays];
        Arrays.fill(expected, double[].class);
        if (!Arrays.equals(expected, evaluate.getParameterTypes())) {
            throw new Defect("evaluate must take " + arrays + " arrays of double, not "
                    + Arrays.toString(evaluate.getParameterTypes()));
        }
    }

    /** The length that the class gives for a result. */
    int length(Quantity quantity) throws Defect {
        String name =
                single ? "LENGTH" : quantity.symbol().toUpperCase(Locale.ROOT).replace('-', '_') + "_LENGTH";
        try {
            return type.getField(name).getInt(null);
        } catch (ReflectiveOperationException e) {
            throw new Defect("there is no constant " + name, e);
        }
    }

    /** The class's method that says where a component is. */
    SlotMap.ClassIndex index(Quantity quantity, int rank) throws Defect {
        String name = single ? "index" : quantity.variableName() + "Index";
        Class<?>[] indices = new Class<?>[rank];
        Arrays.fill(indices, int.class);
        Method method;
        try {
            method = type.getMethod(name, indices);
        } catch (NoSuchMethodException e) {
            throw new Defect("there is no method " + name + " of " + rank + " indices", e);
        }
        return tuple -> {
            Object[] arguments = Arrays.stream(tuple).boxed().toArray();
            try {
                return (int) method.invoke(null, arguments);
            } catch (ReflectiveOperationException e) {
                throw new IllegalStateException(name + Arrays.toString(tuple) + " fails", e);
            }
        };
    }

    /**
     * Makes an object.
     *
     * @param functions the object that stands for the caller's functions, by the type that the constructor asks for; not
     *     used when it asks for none
     */
    Object construct(double[] parameters, boolean hasFunctions, Function<Class<?>, Object> functions) throws Defect {
        int arguments = parameters.length + (hasFunctions ? 1 : 0);
        for (Constructor<?> constructor : type.getConstructors()) {
            if (constructor.getParameterCount() != arguments) {
                continue;
            }
            List<Object> values = new ArrayList<>();
            for (double parameter : parameters) {
                values.add(parameter);
            }
            if (hasFunctions) {
                values.add(functions.apply(constructor.getParameterTypes()[parameters.length]));
            }
            try {
                return constructor.newInstance(values.toArray());
            } catch (InvocationTargetException e) {
                throw new Defect("the constructor refuses " + Arrays.toString(parameters), e.getCause());
            } catch (ReflectiveOperationException | IllegalArgumentException e) {
                throw new Defect("the constructor cannot be called", e);
            }
        }
        throw new Defect("there is no constructor of " + arguments + " arguments");
    }

    /** Calls {@code evaluate}. */
    void evaluate(Object kernel, double[][] arrays) throws Defect {
        try {
            evaluate.invoke(kernel, (Object[]) arrays);
        } catch (InvocationTargetException e) {
            throw new Defect("evaluate fails", e.getCause());
        } catch (ReflectiveOperationException e) {
            throw new Defect("evaluate cannot be called", e);
        }
    }

    /** Calls {@code inDomain}. */
    boolean inDomain(Object kernel, double[] point) throws Defect {
        try {
            return (boolean) type.getMethod("inDomain", double[].class).invoke(kernel, (Object) point);
        } catch (InvocationTargetException e) {
            throw new Defect("inDomain fails", e.getCause());
        } catch (ReflectiveOperationException e) {
            throw new Defect("inDomain cannot be called", e);
        }
    }
}
