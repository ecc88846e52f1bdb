package org.steamwitness.architecture;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.AccessTarget.CodeUnitAccessTarget;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import java.lang.reflect.Member;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * A use of a method, constructor or field that a rule forbids. A method reference is a use as much as a call.
 *
 * @param owner the class it belongs to; subclasses count
 * @param names the names of the members, {@code <init>} for constructors; the owner has to have them
 * @param unlessGiven parameter types that make the use harmless, such as a locale
 */
record Call(Class<?> owner, Set<String> names, Set<Class<?>> unlessGiven) implements Predicate<JavaAccess<?>> {

    Call {
        if (!membersOf(owner).containsAll(names)) {
            throw new IllegalArgumentException(owner.getName() + " lacks one of " + names);
        }
    }

    static Call to(Class<?> owner, String... names) {
        return new Call(owner, Set.of(names), Set.of());
    }

    static Call making(Class<?> owner) {
        return to(owner, "<init>");
    }

    Call unlessGiven(Class<?>... types) {
        return new Call(owner, names, Set.of(types));
    }

    static DescribedPredicate<JavaAccess<?>> anyOf(String described, List<Call> calls) {
        return DescribedPredicate.describe(described, access -> calls.stream().anyMatch(call -> call.test(access)));
    }

    @Override
    public boolean test(JavaAccess<?> access) {
        return names.contains(access.getTarget().getName())
                && access.getTargetOwner().isAssignableTo(owner)
                && !(access.getTarget() instanceof CodeUnitAccessTarget called && isGiven(called));
    }

    private boolean isGiven(CodeUnitAccessTarget called) {
        List<JavaClass> parameters = called.getRawParameterTypes();
        return unlessGiven.stream().anyMatch(type -> parameters.stream().anyMatch(p -> p.isEquivalentTo(type)));
    }

    private static Set<String> membersOf(Class<?> owner) {
        return Stream.of(Stream.of("<init>"), namesOf(owner.getMethods()), namesOf(owner.getFields()))
                .flatMap(names -> names)
                .collect(Collectors.toSet());
    }

    private static Stream<String> namesOf(Member... members) {
        return Stream.of(members).map(Member::getName);
    }
}
