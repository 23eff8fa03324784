package pinchoff.kernel.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.io.PrintStream;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import pinchoff.display.Host;

@Timeout(value = 60, unit = TimeUnit.SECONDS)
@SuppressWarnings("StringConcatToTextBlock") // escapes show what is meant
class OutputTest {
  private final PrintStream outOfTheProcess = System.out;
  private final Host hostOfTheProcess = Host.current();
  private CellScript session;

  @BeforeEach
  void open() {
    session = new CellScript(Map.of("V_DD", "1.62 V"));
  }

  @AfterEach
  void close() {
    session.close();
    assertSame(outOfTheProcess, System.out);
    assertSame(hostOfTheProcess, Host.current());
  }

  @Test
  void everyWayToPrintReachesTheCell() {
    session
        .cell(
            "System.out.print('a'); System.out.println(1L); System.out.printf(\"%.1f%n\", 2.5);\n"
                + "System.out.append(\"b\").append('c').append(\"xdx\", 1, 2);\n"
                + "System.out.println((Object) null); System.out.println(new char[] {'e'});\n"
                + "System.out.write(\"\\u00b5V \\ud83d\\ude00\".getBytes(\"UTF-8\"));\n"
                + "System.out.write(0xc2); System.out.write(0xb5); System.out.println();\n"
                + "System.out.print(1.5f); System.out.print(true); System.out.print(-3);")
        .prints("a1\n2.5\nbcdnull\ne\n\u00b5V \ud83d\ude00\u00b5\n1.5true-3");
    session.cell("System.err.println(\"oh\");").prints("").complains("oh\n");
  }

  @Test
  void whatAThreadPrintsLaterReachesItsOwnCell() throws InterruptedException {
    CellScript.Ran first =
        session.cell(
            "var go = new java.util.concurrent.CountDownLatch(1);\n"
                + "new Thread(() -> { try { go.await(); } catch (InterruptedException e) { }\n"
                + "  System.out.println(\"late\"); throw new IllegalStateException(\"gone\"); },"
                + " \"worker\").start();");
    CellScript.Ran second = session.cell("System.out.print(\"second\"); go.countDown();");
    first.output().await(o -> o.err().contains("IllegalStateException: gone"));
    first.prints("late\n").complains("in thread \"worker\"").complains("cell 1, line 3");
    second.prints("second");
  }

  @Test
  void poolsOfEarlierCellsStayUsable() {
    session.cell("var pool = java.util.concurrent.Executors.newFixedThreadPool(1);").isQuiet();
    session.cell("pool.submit(() -> 7).get()").shows("7");
    session.cell("pool.shutdown();").isQuiet();
  }

  @Test
  void theCommonPoolWorksForTheCellThatRuns() {
    session.cell("1");
    for (int i = 0; i < 3; i++) {
      session
          .cell(
              "java.util.concurrent.CompletableFuture.runAsync(() -> System.out.print(\"pool\"))"
                  + ".join();")
          .prints("pool");
    }
  }

  @Test
  void inputIsAskedOfTheUser() {
    session
        .cellWithAnswers(
            "var in = new java.util.Scanner(System.in);\nin.nextInt() + in.nextInt()", "3 4")
        .shows("7");
    CellScript.Ran asked =
        session.cellWithAnswers("pinchoff.display.Host.current().ask(\"key?\", true)", "secret");
    asked.shows("secret");
    assertEquals(List.of("ask key? true"), asked.output().events());
    session.cellWithAnswers("System.in.read()", "\u0004").shows("-1");
  }

  @Test
  void theHostIsTheSession() {
    CellScript.Ran ran =
        session.cell(
            "import pinchoff.display.*;\nvar host = Host.current();\nhost.publish(MimeBundle.text(\"a\"));\n"
                + "host.publish(\"id\", MimeBundle.text(\"b\")); host.update(\"id\","
                + " MimeBundle.text(\"c\")); host.clear(true); int mine = 5;\n"
                + "host.lookup(\"mine\").get() + \" \" + host.premise(\"V_DD\").get()");
    ran.shows("5 1.62 V");
    assertEquals(
        List.of("publish - a", "publish id b", "update id c", "clear true"), ran.output().events());
    session.cell("host.noteTechnology(\"larch180\", \"abc\");").showsNothing();
    assertEquals(Map.of("larch180", "abc"), session.evaluator.technologies());
  }
}
