package pinchoff.kernel.eval;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.ExpressionStatementTree;
import com.sun.source.tree.LambdaExpressionTree;
import com.sun.source.tree.ReturnTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.TreeScanner;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Finds out what the units of a cell are and which of them can be compiled together.
 *
 * <p>Compiling costs far more than running, and twenty statements in one block compile as fast as
 * one. Only statements that declare nothing go into a block, and never the unit whose value the
 * cell shows.
 */
final class CellPlan {
  private static final Set<Tree.Kind> PLAIN =
      EnumSet.of(
          Tree.Kind.BLOCK,
          Tree.Kind.IF,
          Tree.Kind.FOR_LOOP,
          Tree.Kind.ENHANCED_FOR_LOOP,
          Tree.Kind.WHILE_LOOP,
          Tree.Kind.DO_WHILE_LOOP,
          Tree.Kind.TRY,
          Tree.Kind.SWITCH,
          Tree.Kind.SYNCHRONIZED,
          Tree.Kind.ASSERT);
  private static final Set<Tree.Kind> PLAIN_EXPRESSION =
      EnumSet.of(
          Tree.Kind.METHOD_INVOCATION,
          Tree.Kind.NEW_CLASS,
          Tree.Kind.ASSIGNMENT,
          Tree.Kind.PREFIX_INCREMENT,
          Tree.Kind.POSTFIX_INCREMENT,
          Tree.Kind.PREFIX_DECREMENT,
          Tree.Kind.POSTFIX_DECREMENT);

  /** A block must stay well below the largest size of a method. */
  private static final int MAX_RUN = 100;

  private static final int MAX_RUN_CHARACTERS = 10_000;

  private CellPlan() {}

  /** The same units with their kinds found out. */
  static List<CellUnit> classify(List<CellUnit> units, JavaParser parser) {
    List<CellUnit> known = new ArrayList<>();
    List<String> texts = units.stream().map(CellUnit::text).toList();
    List<Optional<List<StatementTree>>> bodies = parser.statements(texts);
    for (int i = 0; i < units.size(); i++) {
      CellUnit unit = units.get(i);
      Optional<List<StatementTree>> body = bodies.get(i);
      if (unit.kind() == CellUnit.Kind.BROKEN) {
        known.add(unit);
      } else if (body.isEmpty()) {
        known.add(parser.isJava(unit.text()) ? unit : unit.as(CellUnit.Kind.BROKEN));
      } else {
        boolean plain = !unit.showsValue() || JavaText.lastOf(unit.text()) == '}';
        boolean all = body.get().stream().allMatch(CellPlan::isPlain);
        known.add(plain && all ? unit.as(CellUnit.Kind.PLAIN) : unit);
      }
    }
    return known;
  }

  /** Runs of neighbours that may be compiled together; every other unit is a run of its own. */
  static List<List<CellUnit>> runs(List<CellUnit> units) {
    List<List<CellUnit>> runs = new ArrayList<>();
    for (CellUnit unit : units) {
      boolean joins =
          unit.kind() == CellUnit.Kind.PLAIN
              && !runs.isEmpty()
              && last(last(runs)).kind() == CellUnit.Kind.PLAIN
              && last(runs).size() < MAX_RUN
              && unit.end() - last(runs).get(0).start() < MAX_RUN_CHARACTERS;
      if (joins) {
        last(runs).add(unit);
      } else {
        runs.add(new ArrayList<>(List.of(unit)));
      }
    }
    return runs;
  }

  private static <T> T last(List<T> list) {
    return list.get(list.size() - 1);
  }

  private static boolean isPlain(StatementTree statement) {
    boolean shape =
        statement instanceof ExpressionStatementTree e
            ? isPlainExpression(e.getExpression().getKind())
            : PLAIN.contains(statement.getKind());
    return shape && !Boolean.TRUE.equals(LEAVES.scan(statement, null));
  }

  private static boolean isPlainExpression(Tree.Kind kind) {
    return PLAIN_EXPRESSION.contains(kind) || kind.name().endsWith("_ASSIGNMENT");
  }

  /** Finds statements that leave the unit: in a block they would leave the neighbours too. */
  private static final TreeScanner<@Nullable Boolean, @Nullable Void> LEAVES =
      new TreeScanner<>() {
        @Override
        public @Nullable Boolean visitReturn(ReturnTree node, @Nullable Void p) {
          return true;
        }

        @Override
        public @Nullable Boolean visitLambdaExpression(
            LambdaExpressionTree node, @Nullable Void p) {
          return false;
        }

        @Override
        public @Nullable Boolean visitClass(ClassTree node, @Nullable Void p) {
          return false;
        }

        @Override
        public @Nullable Boolean reduce(@Nullable Boolean a, @Nullable Boolean b) {
          return Boolean.TRUE.equals(a) || Boolean.TRUE.equals(b);
        }
      };
}
