package org.gasmargin.rules;

import dev.cel.common.CelAbstractSyntaxTree;
import dev.cel.common.ast.CelConstant;
import dev.cel.common.ast.CelExpr;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.gasmargin.units.NearestName;
import org.gasmargin.yaml.Issues;
import org.gasmargin.yaml.Printable;
import org.gasmargin.yaml.YamlNode.Text;

/**
 * Looks at every name, call and literal of a parsed expression before its dimensions are checked,
 * so that a misspelt name is answered with the nearest one.
 */
final class NameCheck {
  private static final List<String> FUNCTIONS =
      Arrays.stream(Constant.values()).map(Constant::key).toList();
  private static final Set<CelConstant.Kind> LITERALS =
      Set.of(
          CelConstant.Kind.BOOLEAN_VALUE,
          CelConstant.Kind.DOUBLE_VALUE,
          CelConstant.Kind.INT64_VALUE,
          CelConstant.Kind.STRING_VALUE);

  private final CelAbstractSyntaxTree ast;
  private final Text source;
  private final Scope scope;
  private final Set<String> names = new TreeSet<>();
  private final Issues issues;

  /**
   * Looks at all nodes.
   *
   * @param ast the parsed expression
   * @param source where it stands
   * @param scope which names it may use
   * @param issues receives what is not in the language
   */
  NameCheck(CelAbstractSyntaxTree ast, Text source, Scope scope, Issues issues) {
    this.ast = ast;
    this.source = source;
    this.scope = scope;
    this.issues = issues;
    visit(ast.getExpr());
  }

  /** The names used. */
  Set<String> names() {
    return names;
  }

  private void visit(CelExpr node) {
    switch (node.getKind()) {
      case CONSTANT -> visitConstant(node);
      case IDENT, SELECT -> visitName(node);
      case CALL -> visitCall(node);
      default -> refuse(node, "lists, maps and messages are not part of the rule language");
    }
  }

  private void visitConstant(CelExpr node) {
    if (!LITERALS.contains(node.constant().getKind())) {
      refuse(node, "only numbers, words in quotes, true and false are part of the rule language");
    }
  }

  private void visitName(CelExpr node) {
    CelExpr root = node;
    String rest = "";
    while (root.getKind() == CelExpr.ExprKind.Kind.SELECT) {
      rest = "." + root.select().field() + rest;
      root = root.select().operand();
    }
    if (root.getKind() != CelExpr.ExprKind.Kind.IDENT) {
      visit(root);
      refuse(node, "a value has no parts: '" + rest + "' cannot be taken from it");
      return;
    }
    String name = root.ident().name() + rest;
    if (!Vocabulary.all().contains(name)) {
      issues.add(
          source.placeOf(offset(root)),
          "unknown name " + Printable.quote(name),
          NearestName.of(name, Vocabulary.all())
              .map(nearest -> "did you mean '" + nearest + "'?")
              .orElse("docs/rules.md lists the names"));
    } else if (!scope.permits(name)) {
      refuse(root, "'" + name + "' cannot be used here, only " + scope.words());
    } else {
      names.add(name);
    }
  }

  private void visitCall(CelExpr node) {
    CelExpr.CelCall call = node.call();
    String function = call.function();
    if (call.target().isPresent()) {
      refuse(node, "calls on a value, as in x." + function + "(), are not permitted");
    } else if (function.equals("-_")) {
      refuse(node, "a minus stands before a figure only, as in K(-5.0)");
    } else if (Character.isLetter(function.codePointAt(0)) && !FUNCTIONS.contains(function)) {
      issues.add(
          source.placeOf(startOfCall(node, function)),
          "unknown function " + Printable.quote(function),
          "there are " + String.join(", ", FUNCTIONS));
    }
    Stream.concat(call.target().stream(), call.args().stream()).forEach(this::visit);
  }

  /** The parser marks a call at its opening parenthesis; the name stands before it. */
  private int startOfCall(CelExpr node, String function) {
    return Math.max(0, offset(node) - function.codePointCount(0, function.length()));
  }

  private void refuse(CelExpr node, String problem) {
    issues.add(source.placeOf(offset(node)), problem);
  }

  private int offset(CelExpr node) {
    return ast.getSource().getPositionsMap().getOrDefault(node.id(), 0);
  }
}
