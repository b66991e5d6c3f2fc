package gnomon.evaluate;

import gnomon.algebra.Reason;
import gnomon.algebra.Refusal;
import gnomon.form.Accumulation;
import gnomon.form.Exponential;
import gnomon.form.Factored;
import gnomon.form.Form;
import gnomon.form.Generator;
import gnomon.form.Structure;
import gnomon.form.Unknown;
import gnomon.form.Variable;
import gnomon.number.Rational;
import gnomon.recurrence.ConstantsFromConditions;
import gnomon.recurrence.DifferentialSolver;
import gnomon.recurrence.LinearEquation;
import gnomon.recurrence.Lowered;
import gnomon.recurrence.RecurrenceSolver;
import gnomon.recurrence.SingularPoint;
import gnomon.recurrence.SolutionSpace;
import gnomon.recurrence.StepByStep;
import gnomon.recurrence.UnknownFunction;
import gnomon.summation.Condition;
import gnomon.syntax.Expression;
import gnomon.value.Status;
import gnomon.value.Value;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;

/// `solve L f = g with f(0) = 1`: reads the equation and the conditions with the unknown function
/// free, has the equation solved, and puts what comes back into what was written.
final class Solving {
  private final Evaluator evaluator;
  private final Evaluation evaluation;

  Solving(Evaluator evaluator, Evaluation evaluation) {
    this.evaluator = evaluator;
    this.evaluation = evaluation;
  }

  Value value(Expression.Solve solve, Scope scope) {
    Optional<Value> operator = new OperatorEquations(evaluator).value(solve, scope);
    if (operator.isPresent()) {
      return operator.get();
    }
    Optional<String> held = new UnknownName(scope).heldArgument(solve);
    return held.isPresent() ? at(held.get(), solve, scope) : solved(solve, scope);
  }

  /// The solution at the number or form that the variable of the equation stands for here.
  private Value at(String name, Expression.Solve solve, Scope scope) {
    Value number = evaluator.value(new Expression.Name(name, solve.equation().span()), scope);
    Map<Generator, Form> image =
        Map.of(new Variable(name), Sorts.form(number, solve.equation().span(), "the argument"));
    List<Condition> earlier = evaluation.conditions();
    evaluation.conditions(List.of());
    Value solution;
    try {
      solution = solved(solve, scope.without(name));
    } catch (LocatedRefusal refused) {
      evaluation.conditions(earlier);
      return stepByStep(refused, image.get(new Variable(name)), solve, scope.without(name));
    }
    List<Condition> met = evaluation.conditions();
    evaluation.conditions(earlier);
    for (Condition condition : met) {
      Form subject = condition.subject().substitute(image);
      if (!subject.isConstant()) {
        evaluation.require(List.of(new Condition(subject, condition.relation())));
      } else if (Validity.fails(List.of(condition), image)) {
        throw Problems.of(
            "domain-validity", "the solution does not hold here", solve.equation().span());
      }
    }
    Form form = Sorts.form(solution, solve.span(), "the solution");
    return Places.at(
        solve.span(), () -> Sorts.of(Substitutions.addedUp(form.substitute(image)), scope));
  }

  /// The value at an integer where there is no formula, from the given ones.
  private Value stepByStep(
      LocatedRefusal refused, Form point, Expression.Solve solve, Scope scope) {
    if (!isWithoutFormula(refused) || point.asInteger().isEmpty()) {
      throw refused;
    }
    return Places.at(
        solve.span(),
        () -> Sorts.of(problem(solve, scope).valueAt(point.asInteger().orElseThrow()), scope));
  }

  /// Whether an equation was refused because there is no formula for its solution, or none was
  /// found.
  static boolean isWithoutFormula(LocatedRefusal refused) {
    Reason reason = refused.refusal().reason();
    return reason == Reason.NO_SOLUTION || reason == Reason.SOLUTION_NOT_FOUND;
  }

  private Problem problem(Expression.Solve solve, Scope scope) {
    String name = new UnknownName(scope).of(solve);
    UnknownFunction unknown = new UnknownFunction(name);
    Scope inside = scope.with(name, new Binding.Arbitrary(name));
    Form equation = vanishing(solve.equation(), inside);
    List<Form> conditions = new ArrayList<>();
    for (Expression.Equation condition : solve.conditions()) {
      conditions.add(vanishing(condition, inside));
    }
    return new Problem(unknown, equation, conditions, scope.running());
  }

  /// A linear equation whose variable v was moved so that the least argument is v, and by how much.
  record Law(LinearEquation equation, Rational lowest) {}

  /// The equation, read as a linear one in the unknown function.
  Law law(Expression.Solve solve, Scope scope) {
    return Places.at(solve.equation().span(), () -> problem(solve, scope).law());
  }

  /// Its solution in closed form.
  ///
  /// @throws LocatedRefusal where none was found
  Form solution(Expression.Solve solve, Scope scope) {
    return Places.at(solve.equation().span(), () -> problem(solve, scope).solution());
  }

  private Value solved(Expression.Solve solve, Scope scope) {
    Form solution = solution(solve, scope);
    evaluation.status(Status.of(Status.Kind.CLOSED_FORM));
    return Sorts.of(solution, scope);
  }

  /// The left side less the right side.
  private Form vanishing(Expression.Equation equation, Scope scope) {
    Value left = evaluator.value(equation.left(), scope);
    Value right = evaluator.value(equation.right(), scope);
    return Sorts.form(left, equation.left().span(), "the left side")
        .minus(Sorts.form(right, equation.right().span(), "the right side"));
  }

  /// An equation and its conditions as forms that are to vanish.
  private final class Problem {
    private final UnknownFunction unknown;
    private final Form equation;
    private final List<Form> conditions;
    private final Variable variable;
    private final Variable running;

    Problem(UnknownFunction unknown, Form equation, List<Form> conditions, Variable running) {
      this.unknown = unknown;
      this.equation = equation;
      this.conditions = conditions;
      this.running = running;
      this.variable = unknown.variable(equation);
    }

    LinearEquation linear() {
      return unknown.equation(equation, variable);
    }

    Law law() {
      return new Law(linear(), unknown.lowestShift(equation, variable));
    }

    Form solution() {
      LinearEquation linear = linear();
      SolutionSpace space =
          switch (linear.action()) {
            case SHIFT ->
                new RecurrenceSolver(evaluation.sums(), start()).leavingSums().solve(linear);
            case DERIVATIVE -> DifferentialSolver.solve(linear);
          };
      if (space.isEmpty()) {
        throw absent(space);
      }
      List<Variable> constants = constants(space.basis().size());
      Form general = space.combination(constants);
      if (!residual(general).isZero()) {
        throw new Refusal(Reason.SOLUTION_NOT_FOUND, space.within().words());
      }
      evaluation.require(space.nonzero().stream().map(Solving::notZero).toList());
      explain(space, general);
      Form solution = met(space, general, constants);
      evaluation
          .grounds()
          .equal(
              "put into the equation, left side less right side",
              residual(solution),
              Form.ZERO,
              running);
      remarks(space, solution);
      return solution;
    }

    /// The value at an integer, from the conditions that give values.
    Form valueAt(BigInteger point) {
      LinearEquation linear = unknown.equation(equation, variable);
      if (linear.action() != LinearEquation.Action.SHIFT) {
        throw new Refusal(Reason.NOT_DETERMINED, Form.of(point));
      }
      return StepByStep.at(linear, pointValues(), point);
    }

    /// The equation with y put into it; standing sums in it are brought to one upper end.
    private Form residual(Form y) {
      return Lowered.of(unknown.replaced(equation, variable, y), variable);
    }

    /// A condition with y put into it, sums between numbers added up.
    private Form valued(Form condition, Form y) {
      return Substitutions.addedUp(unknown.replaced(condition, variable, y));
    }

    /// The least integer at which a condition is given.
    private Optional<BigInteger> start() {
      return conditions.stream()
          .flatMap(condition -> unknown.occurrences(condition).stream())
          .flatMap(occurrence -> occurrence.argument().asInteger().stream())
          .min(BigInteger::compareTo);
    }

    private Form met(SolutionSpace space, Form general, List<Variable> constants) {
      if (conditions.isEmpty()) {
        return general;
      }
      List<Form> tied = conditions.stream().filter(c -> isTied(c, space)).toList();
      List<Form> met = tied.stream().map(c -> valued(c, general)).toList();
      Optional<List<Form>> values = ConstantsFromConditions.of(met, constants);
      if (values.isEmpty()) {
        throw space.isGeneral() ? contradiction(space) : absent(space);
      }
      for (int i = 0; i < constants.size(); i++) {
        evaluation
            .grounds()
            .found(
                "the conditions give",
                Form.of(constants.get(i)),
                values.get().get(i),
                running,
                "from the linear equations for the constants");
      }
      Form solution = space.withConstants(values.get());
      for (Form condition : tied) {
        if (!valued(condition, solution).isZero()) {
          throw new Refusal(Reason.SOLUTION_NOT_FOUND, space.within().words());
        }
      }
      return solution;
    }

    /// The first argument that the equation ties to the later ones, where that is not the least.
    private Optional<BigInteger> first(SolutionSpace space) {
      return start()
          .filter(_ -> space.skipped() > 0)
          .map(start -> start.add(BigInteger.valueOf(space.skipped())));
    }

    /// Whether the condition is about arguments that the equation ties to the later ones.
    private boolean isTied(Form condition, SolutionSpace space) {
      Optional<BigInteger> first = first(space);
      return first.isEmpty()
          || unknown.occurrences(condition).stream()
              .flatMap(value -> value.argument().asInteger().stream())
              .anyMatch(point -> point.compareTo(first.get()) >= 0);
    }

    /// What contradicts the conditions: the equation at a zero of its leading coefficient, where it
    /// can be told, or the conditions one another.
    private Refusal contradiction(SolutionSpace space) {
      if (!linearShift(space)) {
        return new Refusal(Reason.CONDITIONS_CONTRADICT);
      }
      boolean tied = start().filter(first -> space.undetermined(first).isEmpty()).isPresent();
      return SingularPoint.of(space.equation(), pointValues())
          .map(point -> new Refusal(Reason.CONDITIONS_CONTRADICT, Form.of(point)))
          .orElse(
              tied
                  ? new Refusal(Reason.CONDITIONS_CONTRADICT)
                  : new Refusal(Reason.SOLUTION_NOT_FOUND, space.within().words()));
    }

    /// The conditions that give one value at one integer.
    private SortedMap<BigInteger, Form> pointValues() {
      SortedMap<BigInteger, Form> values = new TreeMap<>();
      for (Form condition : conditions) {
        List<Unknown> occurrences = unknown.occurrences(condition);
        if (occurrences.size() == 1) {
          Unknown value = occurrences.getFirst();
          Form zero = unknown.replaced(condition, variable, Form.ZERO);
          Form slope = unknown.replaced(condition, variable, Form.ONE).minus(zero);
          value
              .argument()
              .asInteger()
              .ifPresent(point -> values.put(point, zero.negated().dividedBy(slope)));
        }
      }
      return values;
    }

    private Refusal absent(SolutionSpace space) {
      Reason reason = space.exhaustive() ? Reason.NO_SOLUTION : Reason.SOLUTION_NOT_FOUND;
      return new Refusal(reason, space.within().words());
    }

    /// C1, C2, … other than those that occur.
    private List<Variable> constants(int count) {
      SortedSet<Variable> taken = new TreeSet<>(equation.variables());
      conditions.stream().map(Form::variables).forEach(taken::addAll);
      List<Variable> constants = new ArrayList<>();
      for (int i = 1; constants.size() < count; i++) {
        Variable constant = new Variable("C" + i);
        if (!taken.contains(constant)) {
          constants.add(constant);
        }
      }
      return constants;
    }

    private void explain(SolutionSpace space, Form general) {
      Form f = Form.of(new Unknown(unknown.name(), 0, Form.of(variable)));
      for (Form y : space.basis()) {
        evaluation
            .grounds()
            .found(
                "a solution where the right side is 0", f, y, running, "checked by substitution");
      }
      Form particular = space.particular().orElseThrow();
      if (!particular.isZero()) {
        evaluation
            .grounds()
            .found("one solution of the whole", f, particular, running, "checked by substitution");
      }
      evaluation
          .grounds()
          .found("together", f, general, running, "put into the equation and found to solve it");
    }

    private void remarks(SolutionSpace space, Form solution) {
      boolean open =
          constants(space.basis().size()).stream().anyMatch(solution::dependsOn)
              || conditions.isEmpty();
      if (open && !space.isGeneral()) {
        evaluation.remark(
            space.exhaustive()
                ? "not all solutions, but all " + space.within().words()
                : "not all solutions");
      }
      evaluation.require(
          Structure.factored(Form.of(solution.denominator())).factors().stream()
              .map(Factored.Factor::base)
              .filter(base -> !base.isConstant() && !base.dependsOn(variable))
              .filter(base -> !(base.asGenerator().orElse(null) instanceof Exponential))
              .map(Solving::notZero)
              .toList());
      for (Generator g : solution.generators()) {
        if (g instanceof Accumulation standing && standing.upper().dependsOn(variable)) {
          evaluation.require(
              List.of(
                  new Condition(
                      Form.of(variable).minus(standing.lower()), Condition.Relation.NATURAL)));
        }
      }
      first(space)
          .ifPresent(
              first ->
                  evaluation.require(
                      List.of(
                          new Condition(
                              Form.of(variable).minus(Form.of(first)),
                              Condition.Relation.NATURAL))));
      if (linearShift(space) && start().isPresent()) {
        List<BigInteger> undetermined = new ArrayList<>(space.undetermined(start().get()));
        undetermined.removeAll(pointValues().keySet());
        for (BigInteger point : undetermined) {
          evaluation.remark(unknown.name() + "(" + point + ") is not determined by the equation");
        }
      }
    }

    private static boolean linearShift(SolutionSpace space) {
      return space.equation().action() == LinearEquation.Action.SHIFT
          && space.equation().hasRationalCoefficients();
    }
  }

  private static Condition notZero(Form form) {
    return new Condition(form, Condition.Relation.NOT_ZERO);
  }
}
