package pinchoff.kernel.eval;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What cells do that would end or cripple a session that is not careful. */
@Timeout(value = 60, unit = TimeUnit.SECONDS)
class FaultTest {
  private CellScript session;

  @BeforeEach
  void open() {
    session = new CellScript();
    session.cell("int kept = 42;");
  }

  @AfterEach
  void close() {
    session.cell("System.out.print(kept)").prints("42");
    session.close();
  }

  @Test
  void endlessRecursionIsReportedInFewLines() {
    session.cell("int deep(int n) { return 1 + deep(n + 1); }").showsNothing();
    CellScript.Ran ran = session.cell("deep(0)").failsWith("StackOverflowError", "").at(1, 1);
    assertTrue(ran.failure().traceback().size() < 40, () -> ran.failure().toString());
    ran.reports("more frames");
  }

  @Test
  void memoryThatIsNotThere() {
    session
        .cell(
            "long[][] all = new long[100_000][]; for (int i = 0; ; i++) all[i % 100_000] = new long[100_000_000];")
        .failsWith("OutOfMemoryError", "");
    session.cell("int[] big = new int[Integer.MAX_VALUE];").failsWith("OutOfMemoryError", "");
    session.cell("all = null;").showsNothing(); // the memory is needed by the tests after this one
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "System.exit(3);",
        "Runtime.getRuntime().exit(3);",
        "Runtime.getRuntime().halt(3);",
        "java.util.function.IntConsumer c = System::exit;\nc.accept(3);",
        "java.util.function.IntConsumer c = Runtime.getRuntime()::halt;\nc.accept(3);",
        "class Quit { void now() { System.exit(3); } }\nnew Quit().now();",
        "Runnable r = () -> System.exit(3);\nr.run();"
      })
  void endingTheProcessIsRefused(String code) {
    session.cell(code).failsWith("ExitRefused", "(3) was not carried out");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "System.setOut(null);",
        "System.setErr(null);",
        "System.setIn(null);",
        "System.setOut(new java.io.PrintStream(new java.io.ByteArrayOutputStream()));"
      })
  void replacedStreamsAreBackInTheNextCell(String code) {
    session.cell(code).showsNothing();
    session.cell("System.out.print(1); System.err.print(2);").prints("1").complains("2");
  }

  @Test
  void closedStreamsStayOpen() {
    session
        .cell("System.out.close(); System.err.close(); System.in.close(); System.out.print(1);")
        .prints("1");
    session.cellWithAnswers("new java.util.Scanner(System.in).nextLine()", "yes").shows("yes");
  }

  @Test
  void manyThreads() {
    session
        .cell(
            """
            var done = new java.util.concurrent.CountDownLatch(2000);
            for (int i = 0; i < 2000; i++) { new Thread(done::countDown).start(); }
            done.await();
            """)
        .showsNothing();
  }

  @Test
  void exceptionsThatMisbehave() {
    session
        .cell(
            "class Odd extends RuntimeException { public String getMessage() { throw this; } }\nthrow new Odd();")
        .failsWith("Odd", "cannot be read");
    session.cell("throw new RuntimeException() { };").failsWith("RuntimeException", "");
    session
        .cell(
            "var a = new Exception(\"a\"); var b = new Exception(\"b\", a); a.initCause(b);\nthrow a;")
        .failsWith("Exception", "a")
        .reports("caused by Exception: b");
    session
        .cell(
            "throw new Exception(\"noTrace\") { public StackTraceElement[] getStackTrace() { return null; } };")
        .failsWith("Exception", "noTrace");
  }

  @Test
  void aStaticInitialiserThatFails() {
    session
        .cell("class Broken { static int x = 1 / 0; }\nBroken.x")
        .failsWith("ExceptionInInitializerError", "")
        .reports("caused by ArithmeticException: / by zero");
  }

  @Test
  void aCellOfManyStatements() {
    StringBuilder code = new StringBuilder("long sum = 0;\n");
    for (int i = 0; i < 1500; i++) {
      code.append("sum += ").append(i).append(";\n");
    }
    session.cell(code + "sum").shows("1124250");
  }
}
