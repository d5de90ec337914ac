package org.gasmargin.rules;

import dev.cel.common.CelFunctionDecl;
import dev.cel.common.CelOverloadDecl;
import dev.cel.common.types.CelType;
import dev.cel.common.types.OpaqueType;
import dev.cel.common.types.SimpleType;
import dev.cel.common.types.TypeParamType;
import dev.cel.runtime.CelFunctionBinding;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.units.Dimension;

/**
 * The functions of the rule language, declared for the checker and bound for the run; there are no
 * others, the library's own environment is switched off. Every dimension is an opaque type of its
 * own, so that only what {@link Arithmetic} permits can meet.
 */
final class FunctionTable {
  private static final Map<Dimension, CelType> TYPES = types();

  private final Map<String, List<CelOverloadDecl>> overloads = new LinkedHashMap<>();
  private final List<CelFunctionBinding> bindings = new ArrayList<>();

  FunctionTable() {
    Arithmetic.operations().forEach(this::add);
    for (Relation relation : Relation.values()) {
      Arithmetic.DIMENSIONS.forEach(dimension -> add(relation, dimension));
    }
    for (String equality : List.of("_==_", "_!=_")) {
      addEquality(equality, SimpleType.STRING, String.class);
      addEquality(equality, SimpleType.BOOL, Boolean.class);
    }
    for (Constant constant : Constant.values()) {
      add(constant);
    }
    addLogic();
  }

  /** The declarations for the checker. */
  List<CelFunctionDecl> declarations() {
    return overloads.entrySet().stream()
        .map(entry -> CelFunctionDecl.newFunctionDeclaration(entry.getKey(), entry.getValue()))
        .toList();
  }

  /** What the functions do. */
  List<CelFunctionBinding> bindings() {
    return bindings;
  }

  /** The checker's type of a dimension. */
  static CelType type(Dimension dimension) {
    return TYPES.getOrDefault(dimension, SimpleType.ERROR);
  }

  /** The dimension of a checker's type, if it is one. */
  static Optional<Dimension> dimensionOf(CelType type) {
    return TYPES.entrySet().stream()
        .filter(entry -> entry.getValue().equals(type))
        .map(Map.Entry::getKey)
        .findFirst();
  }

  /** The value of a number inside an expression. */
  static Object asCelValue(Measure measure) {
    return measure.dimension() == Dimension.RATIO ? (Object) measure.si() : measure;
  }

  /** The number that an expression gave. */
  static Measure asMeasure(Object value) {
    return value instanceof Double ratio ? new Measure(Dimension.RATIO, ratio) : (Measure) value;
  }

  private static Map<Dimension, CelType> types() {
    Map<Dimension, CelType> types = new EnumMap<>(Dimension.class);
    for (Dimension dimension : Arithmetic.DIMENSIONS) {
      types.put(dimension, OpaqueType.create(dimension.name().toLowerCase(Locale.ROOT)));
    }
    types.put(Dimension.RATIO, SimpleType.DOUBLE);
    return types;
  }

  private void add(Arithmetic.Operation operation) {
    Arithmetic.Operator operator = operation.operator();
    Dimension result = operation.result();
    String id =
        operator.function() + " " + operation.left().name() + " " + operation.right().name();
    declare(
        operator.function(),
        CelOverloadDecl.newGlobalOverload(
            id, type(result), type(operation.left()), type(operation.right())));
    bindings.add(
        CelFunctionBinding.from(
            id,
            valueClass(operation.left()),
            valueClass(operation.right()),
            (a, b) -> asCelValue(new Measure(result, operator.apply(si(a), si(b))))));
  }

  private void add(Relation relation, Dimension dimension) {
    String id = relation.function() + " " + dimension.name();
    CelType type = type(dimension);
    Class<?> valueClass = valueClass(dimension);
    declare(
        relation.function(), CelOverloadDecl.newGlobalOverload(id, SimpleType.BOOL, type, type));
    bindings.add(
        CelFunctionBinding.from(
            id, valueClass, valueClass, (a, b) -> relation.holds(si(a), si(b))));
  }

  /** Words and conditions can be equal; computed numbers never are but by chance. */
  private <T> void addEquality(String function, CelType type, Class<T> valueClass) {
    String id = function + " " + type.name();
    boolean wanted = function.equals("_==_");
    declare(function, CelOverloadDecl.newGlobalOverload(id, SimpleType.BOOL, type, type));
    bindings.add(
        CelFunctionBinding.from(id, valueClass, valueClass, (a, b) -> a.equals(b) == wanted));
  }

  /**
   * The logical operations under the identifiers by which the library knows them; it runs all but
   * the negation itself.
   */
  private void addLogic() {
    CelType bool = SimpleType.BOOL;
    CelType any = TypeParamType.create("A");
    declare("_&&_", CelOverloadDecl.newGlobalOverload("logical_and", bool, bool, bool));
    declare("_||_", CelOverloadDecl.newGlobalOverload("logical_or", bool, bool, bool));
    declare("!_", CelOverloadDecl.newGlobalOverload("logical_not", bool, bool));
    declare("_?_:_", CelOverloadDecl.newGlobalOverload("conditional", any, bool, any, any));
    bindings.add(CelFunctionBinding.from("logical_not", Boolean.class, truth -> !truth));
  }

  private void add(Constant constant) {
    String function = constant.key();
    CelType type = type(constant.dimension());
    declare(
        function, CelOverloadDecl.newGlobalOverload(function + " double", type, SimpleType.DOUBLE));
    declare(function, CelOverloadDecl.newGlobalOverload(function + " int", type, SimpleType.INT));
    bindings.add(CelFunctionBinding.from(function + " double", Double.class, constant::of));
    bindings.add(CelFunctionBinding.from(function + " int", Long.class, n -> constant.of(n)));
  }

  private void declare(String function, CelOverloadDecl overload) {
    overloads.computeIfAbsent(function, name -> new ArrayList<>()).add(overload);
  }

  private static double si(Object value) {
    return asMeasure(value).si();
  }

  private static Class<?> valueClass(Dimension dimension) {
    return dimension == Dimension.RATIO ? Double.class : Measure.class;
  }

  /** The comparisons. */
  private enum Relation {
    LESS("_<_"),
    AT_MOST("_<=_"),
    GREATER("_>_"),
    AT_LEAST("_>=_");

    private final String function;

    Relation(String function) {
      this.function = function;
    }

    String function() {
      return function;
    }

    boolean holds(double left, double right) {
      return switch (this) {
        case LESS -> left < right;
        case AT_MOST -> left <= right;
        case GREATER -> left > right;
        case AT_LEAST -> left >= right;
      };
    }
  }
}
