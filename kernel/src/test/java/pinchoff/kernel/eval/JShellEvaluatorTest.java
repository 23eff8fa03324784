package pinchoff.kernel.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.display.Host;

class JShellEvaluatorTest {
  private CellScript session;

  @BeforeEach
  void open() {
    session = new CellScript();
  }

  @AfterEach
  void close() {
    session.close();
  }

  @Test
  void theLastExpressionIsTheResult() {
    session.cell("1+1").shows("2");
    session.cell("int a = 3;\nint b = 4;\na * b // area").shows("12");
    session.cell("a = 5").shows("5");
    session.cell("a").shows("5");
    session.cell("\"text\" + a /* done */").shows("text5");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "1+1;",
        "int x = 5",
        "int x = 5;",
        "String s = null; s",
        "void f() {}",
        "class C {}",
        "System.out.print(\"\")",
        "import java.util.*;",
        "// a comment",
        "",
        "   \n ",
        ";;",
        "for (int i = 0; i < 3; i++) { i += 1; }"
      })
  void declarationsStatementsAndNothingSayNothing(String code) {
    session.cell(code).showsNothing().isQuiet();
  }

  @Test
  void whatRanBeforeAFailureStaysAndNothingAfterItIsDeclared() {
    session
        .cell("int a = 1;\nint b = a / 0;\nint c = 3;")
        .failsWith("ArithmeticException", "/ by zero")
        .at(2, 11);
    session.cell("a").shows("1");
    session.cell("b").failsWith("CompileError", "variable b");
    session.cell("c").failsWith("CompileError", "variable c").at(1, 1);
  }

  @Test
  void statementsAreCompiledTogetherAndStillStopWhereTheyFail() {
    session.cell("int[] seen = new int[4];").showsNothing();
    session
        .cell("seen[0] = 1;\nseen[1] = 1;\n  seen[9] = 1;\nseen[3] = 1;")
        .failsWith("ArrayIndexOutOfBoundsException", "9")
        .at(3, 3)
        .reports("  seen[9] = 1;\n      ^");
    session.cell("seen[0] + seen[1] * 10 + seen[3] * 100").shows("11");
  }

  @Test
  void aBlockThatDoesNotCompileOnlyAsABlockRunsOneByOne() {
    session
        .cell("System.out.print(1);\nthrow new IllegalStateException(\"x\");\nSystem.out.print(2);")
        .prints("1")
        .failsWith("IllegalStateException", "x")
        .at(2, 1);
    session
        .cell(
            "System.out.print(1);\nwhile (true) { throw new RuntimeException(\"y\"); }\n"
                + "System.out.print(2);")
        .prints("1")
        .failsWith("RuntimeException", "y");
  }

  @Test
  void errorsOfNeighboursAreFoundBeforeAnythingRan() {
    session
        .cell("System.out.println(1);\nSystem.out.println(nothing);\nSystem.out.println(3);")
        .prints("")
        .failsWith("CompileError", "cannot find symbol: variable nothing")
        .at(2, 20);
  }

  @Test
  void syntaxErrorsAnywhereAreFoundBeforeAnythingRan() {
    session
        .cell("System.out.println(1);\nint a = 4;\nint b = ) 3;")
        .prints("")
        .failsWith("CompileError", "illegal start of expression")
        .at(3, 9);
    session.cell("a").failsWith("CompileError", "variable a");
    session.cell("int a = 1;\nint 5x;").failsWith("CompileError", "").at(2, 5);
    session.cell("int a = 1\nint b = 2;").failsWith("CompileError", "';' expected").at(1, 10);
    session.cell("String s = \"abc;").failsWith("CompileError", "unclosed string").at(1, 12);
    session.cell("if (true) {").failsWith("CompileError", "end of file").at(1, 12);
  }

  @Test
  void allErrorsOfAUnitAreReported() {
    session
        .cell("int k = x + y;")
        .failsWith("CompileError", "variable x")
        .at(1, 9)
        .reports(
            "cannot find symbol: variable y\nat cell 1, line 1, column 13\n    int k = x + y;");
  }

  @Test
  void forwardReferencesHeal() {
    session.cell("int twice(int x) { return helper(x) * 2; }").showsNothing();
    session.cell("twice(4)").failsWith("UnresolvedReference", "helper(int)");
    session.cell("int helper(int x) { return x + 1; }").showsNothing();
    session.cell("twice(4)").shows("10");
  }

  @Test
  void framesLeadToTheCellThatWroteTheMethod() {
    session
        .cell("// helper\nint half(int x) {\n  int zero = 0;\n  return x / zero;\n}")
        .showsNothing();
    session
        .cell("int y = 2;\nint z = 1 + half(y);")
        .failsWith("ArithmeticException", "/ by zero")
        .at(4, 12)
        .reports("at cell 1, line 4, column 12 in half")
        .reports("at cell 2, line 2, column 13")
        .doesNotReport("REPL")
        .doesNotReport("kernel")
        .doesNotReport("reflect");
  }

  @Test
  void causesAreKeptAndEndless() {
    session
        .cell(
            "throw new IllegalStateException(\"outer\","
                + " new java.io.IOException(\"inner\", new Error()));")
        .failsWith("IllegalStateException", "outer")
        .reports("caused by IOException: inner")
        .reports("caused by Error");
    session.cell("throw new RuntimeException((String) null);").failsWith("RuntimeException", "");
  }

  @Test
  void temporariesAreDropped() {
    long imports = session.evaluator.declarations();
    for (int i = 0; i < 5; i++) {
      session.cell("\"value \" + " + i).shows("value " + i);
    }
    assertEquals(imports, session.evaluator.declarations());
  }

  @Test
  void variablesAreLookedUpWhileTheyChange() {
    session.cell("int a = 3; var list = new java.util.ArrayList<String>();").showsNothing();
    session.cell("a = 4; list.add(\"x\");").showsNothing();
    assertEquals(Optional.of(4), Host.current().lookup("a"));
    assertEquals(Optional.of(List.of("x")), Host.current().lookup("list"));
    assertEquals(Optional.empty(), Host.current().lookup("missing"));
    session.cell("double a = 2.5;").showsNothing();
    assertEquals(Optional.of(2.5), Host.current().lookup("a"));
  }

  @Test
  void anExpressionIsEvaluatedForItsValue() {
    session.cell("int a = 3;");
    RecordedOutput output = new RecordedOutput();
    assertTrue(
        session.evaluator.express("a * 2", output) instanceof CellOutcome.Success s
            && s.result().orElseThrow().plainText().equals("6"));
    assertTrue(session.evaluator.express("a *", output) instanceof CellOutcome.Failure);
    assertTrue(session.evaluator.express("int b = 3;", output) instanceof CellOutcome.Failure);
    session.cell("b").failsWith("CompileError", "variable b");
  }
}
