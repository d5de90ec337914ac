package org.gasmargin.rules;

import dev.cel.checker.CelStandardDeclarations;
import dev.cel.checker.CelStandardDeclarations.StandardFunction;
import dev.cel.common.CelAbstractSyntaxTree;
import dev.cel.common.CelFunctionDecl;
import dev.cel.common.CelOptions;
import dev.cel.common.CelOverloadDecl;
import dev.cel.common.CelValidationException;
import dev.cel.common.CelValidationResult;
import dev.cel.common.types.CelType;
import dev.cel.common.types.OpaqueType;
import dev.cel.common.types.SimpleType;
import dev.cel.compiler.CelCompiler;
import dev.cel.compiler.CelCompilerBuilder;
import dev.cel.compiler.CelCompilerFactory;
import dev.cel.runtime.CelEvaluationException;
import dev.cel.runtime.CelFunctionBinding;
import dev.cel.runtime.CelRuntime;
import dev.cel.runtime.CelRuntimeFactory;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.gasmargin.units.Dimension;
import org.gasmargin.yaml.TextIssue;
import org.gasmargin.yaml.YamlNode.Scalar;

/**
 * The language of rule expressions: the Common Expression Language with one opaque type for each
 * dimension and nothing but comparison, arithmetic and logic. It has no loops, no calls on values
 * and no way to the machine. Names and dimensions are checked when an expression is compiled.
 */
final class ExpressionLanguage {
  private static final int LONGEST = 500;
  private static final int DEEPEST = 32;
  private static final List<String> RELATIONS = List.of("_<_", "_<=_", "_>_", "_>=_");
  private static final Map<Dimension, CelType> TYPES = types();

  private final CelCompiler compiler;
  private final CelRuntime runtime;

  /** Sets the language up; costs some tens of milliseconds, so once a run. */
  ExpressionLanguage() {
    List<CelFunctionBinding> bindings = new ArrayList<>();
    List<CelFunctionDecl> functions = functions(bindings);
    CelOptions options =
        CelOptions.current()
            .maxExpressionCodePointSize(LONGEST)
            .maxParseRecursionDepth(DEEPEST)
            .enableComprehension(false)
            .build();
    compiler = compiler(functions, options);
    runtime =
        CelRuntimeFactory.legacyCelRuntimeBuilder()
            .setOptions(options)
            .addFunctionBindings(bindings)
            .build();
  }

  /**
   * Compiles one expression.
   *
   * @param source where it stands
   * @param scope which names it may use
   * @param issues receives every error with its place
   * @return the expression, or empty if there was an error
   */
  Optional<Expression> compile(Scalar source, Scope scope, List<TextIssue> issues) {
    Optional<Expression> simple = simple(source.value(), scope);
    return simple.isPresent() ? simple : compileCompound(source, scope, issues);
  }

  /** What needs no checker: most expressions of a pack are one figure or one name. */
  private static Optional<Expression> simple(String text, Scope scope) {
    if (text.equals("true") || text.equals("false")) {
      Operand truth = new Operand.Truth(text.equals("true"));
      return Optional.of(new Expression.Literal(text, truth, Optional.empty()));
    }
    if (Vocabulary.all().contains(text) && scope.permits(text) && !Vocabulary.isWord(text)) {
      return Optional.of(new Expression.Name(text, Vocabulary.dimension(text)));
    }
    return Constant.parse(text)
        .map(
            measure ->
                new Expression.Literal(
                    text, Operand.number(measure, "", text), Optional.of(measure.dimension())));
  }

  private Optional<Expression> compileCompound(Scalar source, Scope scope, List<TextIssue> issues) {
    CelValidationResult parsed = compiler.parse(source.value());
    if (parsed.hasError()) {
      parsed.getErrors().forEach(issue -> issues.add(SyntaxWords.of(source, issue)));
      return Optional.empty();
    }
    try {
      NameCheck names = new NameCheck(parsed.getAst(), source, scope);
      if (!names.issues().isEmpty()) {
        issues.addAll(names.issues());
        return Optional.empty();
      }
      CelValidationResult checked = compiler.check(parsed.getAst());
      if (checked.hasError()) {
        checked.getErrors().forEach(issue -> issues.add(DimensionWords.of(source, issue)));
        return Optional.empty();
      }
      return program(source, names, checked.getAst(), issues);
    } catch (CelValidationException | CelEvaluationException e) {
      throw new IllegalStateException("a checked expression was refused: " + source.value(), e);
    }
  }

  private Optional<Expression> program(
      Scalar source, NameCheck names, CelAbstractSyntaxTree ast, List<TextIssue> issues)
      throws CelEvaluationException {
    CelType type = ast.getResultType();
    Optional<Dimension> dimension = dimensionOf(type);
    if (dimension.isEmpty() && !type.equals(SimpleType.BOOL)) {
      issues.add(
          new TextIssue(
              source.place(),
              "gives "
                  + DimensionWords.noun(type.name())
                  + "; a quantity with its unit or a condition was expected, as in K(5.0) or"
                  + " peak_pressure > bar_a(10.0)"));
      return Optional.empty();
    }
    return Optional.of(
        new Expression.Compound(
            source.value(), names.names(), dimension, runtime.createProgram(ast)));
  }

  /** The value of a number inside an expression. */
  static Object asCelValue(Measure measure) {
    return measure.dimension() == Dimension.RATIO ? (Object) measure.si() : measure;
  }

  /** The number that an expression gave. */
  static Measure asMeasure(Object value) {
    return value instanceof Double ratio ? new Measure(Dimension.RATIO, ratio) : (Measure) value;
  }

  /** The name of a dimension's type in messages of the checker. */
  static String typeName(Dimension dimension) {
    return dimension.name().toLowerCase(Locale.ROOT);
  }

  private static Map<Dimension, CelType> types() {
    Map<Dimension, CelType> types = new EnumMap<>(Dimension.class);
    for (Dimension dimension : Arithmetic.DIMENSIONS) {
      types.put(dimension, OpaqueType.create(typeName(dimension)));
    }
    types.put(Dimension.RATIO, SimpleType.DOUBLE);
    return types;
  }

  private static Optional<Dimension> dimensionOf(CelType type) {
    return TYPES.entrySet().stream()
        .filter(entry -> entry.getValue().equals(type))
        .map(Map.Entry::getKey)
        .findFirst();
  }

  private static CelCompiler compiler(List<CelFunctionDecl> functions, CelOptions options) {
    CelCompilerBuilder builder =
        CelCompilerFactory.standardCelCompilerBuilder()
            .setOptions(options)
            .setStandardMacros(List.of())
            .setStandardEnvironmentEnabled(false)
            .setStandardDeclarations(
                CelStandardDeclarations.newBuilder()
                    .includeFunctions(
                        StandardFunction.CONDITIONAL,
                        StandardFunction.LOGICAL_NOT,
                        StandardFunction.LOGICAL_AND,
                        StandardFunction.LOGICAL_OR)
                    .build())
            .addFunctionDeclarations(functions);
    for (String name : Vocabulary.all()) {
      builder.addVar(name, typeOf(name));
    }
    return builder.build();
  }

  private static CelType typeOf(String name) {
    return Vocabulary.dimension(name)
        .map(ExpressionLanguage::type)
        .orElse(Vocabulary.isWord(name) ? SimpleType.STRING : SimpleType.BOOL);
  }

  /** Declares every function and adds what it does to {@code bindings}. */
  private static List<CelFunctionDecl> functions(List<CelFunctionBinding> bindings) {
    Map<String, List<CelOverloadDecl>> overloads = new LinkedHashMap<>();
    for (Arithmetic.Operation operation : Arithmetic.operations()) {
      declare(overloads, bindings, operation);
    }
    for (Dimension dimension : Arithmetic.DIMENSIONS) {
      for (String relation : RELATIONS) {
        declare(overloads, bindings, relation, dimension);
      }
    }
    for (String relation : List.of("_==_", "_!=_")) {
      declareEquality(overloads, bindings, relation, SimpleType.STRING, String.class);
      declareEquality(overloads, bindings, relation, SimpleType.BOOL, Boolean.class);
    }
    for (Constant constant : Constant.values()) {
      declare(overloads, bindings, constant);
    }
    return overloads.entrySet().stream()
        .map(entry -> CelFunctionDecl.newFunctionDeclaration(entry.getKey(), entry.getValue()))
        .toList();
  }

  private static void declare(
      Map<String, List<CelOverloadDecl>> overloads,
      List<CelFunctionBinding> bindings,
      Arithmetic.Operation operation) {
    Arithmetic.Operator operator = operation.operator();
    Dimension result = operation.result();
    String id =
        String.join(
            " ", operator.function(), typeName(operation.left()), typeName(operation.right()));
    add(
        overloads,
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

  private static void declare(
      Map<String, List<CelOverloadDecl>> overloads,
      List<CelFunctionBinding> bindings,
      String relation,
      Dimension dimension) {
    String id = relation + " " + typeName(dimension);
    CelType type = type(dimension);
    add(overloads, relation, CelOverloadDecl.newGlobalOverload(id, SimpleType.BOOL, type, type));
    Class<?> valueClass = valueClass(dimension);
    bindings.add(
        CelFunctionBinding.from(
            id, valueClass, valueClass, (a, b) -> compare(relation, si(a), si(b))));
  }

  /** Words and conditions can be equal; computed numbers never are but by chance. */
  private static <T> void declareEquality(
      Map<String, List<CelOverloadDecl>> overloads,
      List<CelFunctionBinding> bindings,
      String relation,
      CelType type,
      Class<T> valueClass) {
    String id = relation + " " + type.name();
    boolean wanted = relation.equals("_==_");
    add(overloads, relation, CelOverloadDecl.newGlobalOverload(id, SimpleType.BOOL, type, type));
    bindings.add(
        CelFunctionBinding.from(id, valueClass, valueClass, (a, b) -> a.equals(b) == wanted));
  }

  private static void declare(
      Map<String, List<CelOverloadDecl>> overloads,
      List<CelFunctionBinding> bindings,
      Constant constant) {
    String id = constant.key();
    CelType type = type(constant.dimension());
    add(overloads, id, CelOverloadDecl.newGlobalOverload(id + " double", type, SimpleType.DOUBLE));
    add(overloads, id, CelOverloadDecl.newGlobalOverload(id + " int", type, SimpleType.INT));
    bindings.add(CelFunctionBinding.from(id + " double", Double.class, constant::of));
    bindings.add(CelFunctionBinding.from(id + " int", Long.class, n -> constant.of(n)));
  }

  private static void add(
      Map<String, List<CelOverloadDecl>> overloads, String function, CelOverloadDecl overload) {
    overloads.computeIfAbsent(function, name -> new ArrayList<>()).add(overload);
  }

  private static double si(Object value) {
    return asMeasure(value).si();
  }

  private static CelType type(Dimension dimension) {
    return TYPES.getOrDefault(dimension, SimpleType.ERROR);
  }

  private static Class<?> valueClass(Dimension dimension) {
    return dimension == Dimension.RATIO ? Double.class : Measure.class;
  }

  private static boolean compare(String relation, double a, double b) {
    return switch (relation) {
      case "_<_" -> a < b;
      case "_<=_" -> a <= b;
      case "_>_" -> a > b;
      default -> a >= b;
    };
  }
}
