package org.gasmargin.rules;

import dev.cel.common.CelAbstractSyntaxTree;
import dev.cel.common.CelIssue;
import dev.cel.common.CelOptions;
import dev.cel.common.CelValidationException;
import dev.cel.common.CelValidationResult;
import dev.cel.common.types.CelType;
import dev.cel.common.types.SimpleType;
import dev.cel.compiler.CelCompiler;
import dev.cel.compiler.CelCompilerBuilder;
import dev.cel.compiler.CelCompilerFactory;
import dev.cel.runtime.CelEvaluationException;
import dev.cel.runtime.CelRuntime;
import dev.cel.runtime.CelRuntimeFactory;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import org.gasmargin.units.Dimension;
import org.gasmargin.units.Place;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Printable;
import org.gasmargin.yaml.YamlNode.Text;

/**
 * The language of rule expressions: the Common Expression Language with one opaque type for each
 * dimension and nothing but comparison, arithmetic and logic. It has no loops, no calls on values
 * and no way to the machine. Names and dimensions are checked when an expression is compiled.
 */
final class ExpressionLanguage {
  /** Most letters of an expression. */
  static final int LONGEST = 500;

  private static final int DEEPEST = 32;
  private static final Pattern SINGLE_EQUALS = Pattern.compile("[^=<>!]=[^=]");

  private final Map<String, Expression> compiled = new HashMap<>();
  private final CelCompiler compiler;
  private final CelRuntime runtime;

  /** Sets the language up; costs a tenth of a second in a cold start, so once a run. */
  ExpressionLanguage() {
    FunctionTable functions = new FunctionTable();
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
            .setStandardEnvironmentEnabled(false)
            .addFunctionBindings(functions.bindings())
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
  Optional<Expression> compile(Text source, Scope scope, Issues issues) {
    Optional<Expression> simple = simple(source.value(), scope);
    if (simple.isPresent()) {
      return simple;
    }
    Optional<Expression> before =
        Optional.ofNullable(compiled.get(source.value()))
            .filter(expression -> expression.names().stream().allMatch(scope::permits));
    if (before.isPresent()) {
      return before;
    }
    Optional<Expression> compound = compileCompound(source, scope, issues);
    compound.ifPresent(expression -> compiled.put(source.value(), expression));
    return compound;
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

  private Optional<Expression> compileCompound(Text source, Scope scope, Issues issues) {
    int before = issues.count();
    CelValidationResult parsed = compiler.parse(source.value());
    if (parsed.hasError()) {
      refuseSyntax(source, parsed.getErrors().get(0), issues);
      return Optional.empty();
    }
    try {
      Set<String> names = new NameCheck(parsed.getAst(), source, scope, issues).names();
      if (issues.count() > before) {
        return Optional.empty();
      }
      CelValidationResult checked = compiler.check(parsed.getAst());
      for (CelIssue issue : checked.getErrors()) {
        issues.add(place(source, issue), DimensionWords.of(issue.getMessage()));
      }
      return issues.count() > before
          ? Optional.empty()
          : program(source, names, checked.getAst(), issues);
    } catch (CelValidationException | CelEvaluationException e) {
      throw new IllegalStateException("a checked expression was refused: " + source.value(), e);
    }
  }

  private Optional<Expression> program(
      Text source, Set<String> names, CelAbstractSyntaxTree ast, Issues issues)
      throws CelEvaluationException {
    CelType type = ast.getResultType();
    Optional<Dimension> dimension = FunctionTable.dimensionOf(type);
    if (dimension.isEmpty() && !type.equals(SimpleType.BOOL)) {
      issues.add(
          source.place(),
          "this gives "
              + DimensionWords.noun(type.name())
              + ", a quantity with its unit or a condition was expected",
          "write for example \"K(5.0)\" or \"peak_pressure > bar_a(10.0)\"");
      return Optional.empty();
    }
    return Optional.of(
        new Expression.Compound(source.value(), names, dimension, runtime.createProgram(ast)));
  }

  /** Only the first error of a syntax is told; those behind it follow from it. */
  private static void refuseSyntax(Text source, CelIssue first, Issues issues) {
    issues.add(
        place(source, first),
        Printable.quote(source.value()) + " is not an expression: " + first.getMessage(),
        SINGLE_EQUALS.matcher(source.value()).find() ? "to compare, write ==" : "");
  }

  private static Place place(Text source, CelIssue issue) {
    int column = issue.getSourceLocation().getColumn();
    return column < 0 ? source.place() : source.placeOf(column);
  }

  private static CelCompiler compiler(FunctionTable functions, CelOptions options) {
    CelCompilerBuilder builder =
        CelCompilerFactory.standardCelCompilerBuilder()
            .setOptions(options)
            .setStandardMacros(List.of())
            .setStandardEnvironmentEnabled(false)
            .addFunctionDeclarations(functions.declarations());
    for (String name : Vocabulary.all()) {
      builder.addVar(name, typeOf(name));
    }
    return builder.build();
  }

  private static CelType typeOf(String name) {
    return Vocabulary.dimension(name)
        .map(FunctionTable::type)
        .orElse(Vocabulary.isWord(name) ? SimpleType.STRING : SimpleType.BOOL);
  }
}
