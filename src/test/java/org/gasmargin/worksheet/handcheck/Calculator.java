package org.gasmargin.worksheet.handcheck;

/** A pocket calculator: reads a line as printed, with + − × / ^ and brackets. */
final class Calculator {
  private final String text;
  private int at;

  private Calculator(String text) {
    this.text = text.replace(" ", "").replace('−', '-').replace('×', '*');
  }

  static double value(String printed) {
    Calculator calculator = new Calculator(printed);
    double value = calculator.sum();
    if (calculator.at != calculator.text.length()) {
      throw new IllegalArgumentException("cannot key in: " + printed);
    }
    return value;
  }

  private double sum() {
    double value = product();
    while (next('+') || next('-')) {
      boolean plus = text.charAt(at++) == '+';
      double other = product();
      value = plus ? value + other : value - other;
    }
    return value;
  }

  private double product() {
    double value = power();
    while (next('*') || next('/')) {
      boolean times = text.charAt(at++) == '*';
      double other = power();
      value = times ? value * other : value / other;
    }
    return value;
  }

  private double power() {
    double base = atom();
    if (next('^')) {
      at++;
      return Math.pow(base, atom());
    }
    return base;
  }

  private double atom() {
    if (next('(')) {
      at++;
      double value = sum();
      at++;
      return value;
    }
    int start = at;
    if (next('-')) {
      at++;
    }
    while (at < text.length() && (Character.isDigit(text.charAt(at)) || next('.'))) {
      at++;
    }
    return Double.parseDouble(text.substring(start, at));
  }

  private boolean next(char c) {
    return at < text.length() && text.charAt(at) == c;
  }
}
