package pinchoff.kernel.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every kind of code that does not end by itself: the session comes back, its variables intact. */
@Timeout(value = 60, unit = TimeUnit.SECONDS)
class InterruptTest {
  private CellScript session;

  @BeforeEach
  void open() {
    session = new CellScript();
    session.cell(
        "int kept = 42; int forEver(int i) { while (true) { i++; } }\n"
            + "void started() { System.out.println(\"started\"); }");
  }

  @AfterEach
  void close() {
    session.close();
  }

  /** Runs a cell that says when it is about to hang, and interrupts it then. */
  private CellScript.Ran interrupted(String code) throws InterruptedException {
    CellScript.Running running = session.start(code);
    running.output().await(o -> o.out().contains("started"));
    session.evaluator.interrupt();
    CellScript.Ran ran = running.end().failsWith("Interrupted", "");
    session.cell("kept").shows("42");
    return ran;
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "{ started(); while (true) { } }",
        "{ started(); for (long i = 0; ; i++) { kept = kept; } }",
        "{ started(); double x = 0; while (true) { x = StrictMath.sin(x) + 1; } }",
        "{ started(); forEver(1); }",
        "{ started(); java.util.stream.Stream.iterate(1, i -> i + 1).forEach(i -> { }); }",
        "{ started(); while (true) { try { while (true) { } } catch (Throwable t) { } } }",
        "{ started(); Thread.sleep(1_000_000); }",
        "{ started(); Object lock = new Object(); synchronized (lock) { lock.wait(); } }",
        "{ started(); while (true) { java.util.concurrent.locks.LockSupport.park(); } }",
        "{ started(); while (true) { try { Thread.sleep(100_000); } catch (InterruptedException e) { } } }",
        "{ started(); java.nio.channels.ServerSocketChannel.open().bind(null).accept(); }",
        "{ started(); java.util.concurrent.Executors.newFixedThreadPool(2).submit(() -> { while (true) { } }).get(); }",
        "{ started(); java.util.stream.IntStream.range(0, 64).parallel().forEach(i -> { while (true) { } }); }",
        "{ started(); do { System.out.print(\"\"); } while (true); }",
        "{ started(); new java.util.concurrent.CompletableFuture<String>().get(); }",
        "{ started(); var host = pinchoff.display.Host.current(); for (;;) { host.checkpoint(); } }",
        "Object o = new Object() { public String toString() { started(); while (true) { } } };\no"
      })
  void comesBack(String code) throws InterruptedException {
    CellScript.Ran ran = interrupted(code);
    assertEquals("The cell was stopped on request.", ran.failure().message(), code);
  }

  @Test
  void aBlockedSocketIsLeftBehindAndTheUserIsTold() throws InterruptedException {
    CellScript.Running running =
        session.start("{ var server = new java.net.ServerSocket(0); started(); server.accept(); }");
    running.output().await(o -> o.out().contains("started"));
    awaitFrame("java.net.ServerSocket", "accept");
    session.evaluator.interrupt();
    CellScript.Ran ran = running.end().failsWith("Interrupted", "");
    session.cell("kept").shows("42");
    assertTrue(ran.failure().message().contains("left behind"), ran.failure().message());
    session.cell("kept + 1").shows("43");
  }

  /** Waits until a thread of this process is in a method. */
  private static void awaitFrame(String type, String method) throws InterruptedException {
    for (int i = 0; i < 1000; i++) {
      boolean there =
          Thread.getAllStackTraces().values().stream()
              .flatMap(java.util.Arrays::stream)
              .anyMatch(f -> f.getClassName().equals(type) && f.getMethodName().equals(method));
      if (there) {
        return;
      }
      Thread.sleep(10);
    }
    throw new AssertionError("no thread came to " + type + "." + method);
  }

  @Test
  void aLongLibraryLoopEndsOrIsLeftBehind() throws InterruptedException {
    CellScript.Ran ran =
        interrupted(
            "var big = java.math.BigInteger.TWO.pow(40_000_000).subtract(java.math.BigInteger.ONE);\n"
                + "{ started(); big.toString(); }");
    String message = ran.failure().message();
    if (Runtime.version().feature() < 20) {
      assertEquals("The cell was stopped on request.", message);
    } else {
      assertTrue(message.contains("left behind"), message);
    }
  }

  @Test
  void aStoppedParallelStreamLeavesTheCommonPool() throws InterruptedException {
    session.cell("var count = new java.util.concurrent.atomic.AtomicLong();");
    interrupted(
        "started();\njava.util.stream.IntStream.range(0, 64).parallel()"
            + ".forEach(i -> { while (true) { count.incrementAndGet(); } });");
    session
        .cell(
            "var pool = java.util.concurrent.ForkJoinPool.commonPool();\n"
                + "pool.awaitQuiescence(5, java.util.concurrent.TimeUnit.SECONDS)")
        .shows("true");
    session
        .cell("java.util.stream.IntStream.range(0, 100).parallel().map(i -> i * 2).sum()")
        .shows("9900");
  }

  @Test
  void aQuestionThatWaitsIsGivenUp() throws InterruptedException {
    CellScript.Running running =
        session.start("String s = pinchoff.display.Host.current().ask(\"name?\", false);");
    running.output().awaitAsked();
    session.evaluator.interrupt();
    running.end().failsWith("Interrupted", "");
    CellScript.Running reading = session.start("int c = System.in.read();");
    reading.output().awaitAsked();
    session.evaluator.interrupt();
    reading.end().failsWith("Interrupted", "");
    session.cell("kept").shows("42");
  }

  @Test
  void threadsOfEarlierCellsGoOn() throws InterruptedException {
    session.cell(
        "var beats = new java.util.concurrent.Semaphore(0);\n"
            + "var beat = new Thread(() -> { while (true) { beats.release(); Thread.yield();"
            + " if (beats.availablePermits() > 1000) { beats.drainPermits(); } } });\n"
            + "beat.setDaemon(true); beat.start();");
    interrupted("started(); while (true) { }");
    session.cell("beats.drainPermits(); beats.acquire(3); beat.isAlive()").shows("true");
    session.cell("1").shows("1");
    interrupted("started(); beats.drainPermits(); while (true) { }");
    session.cell("beat.isAlive()").shows("true");
  }

  @Test
  void nothingAfterTheStopRunsAndTheVariableIsNotDeclared() throws InterruptedException {
    interrupted(
            "int slow() { started(); return forEver(1); }\nint late = slow();\nSystem.out.println(\"after\");")
        .prints("started\n");
    session.cell("late").failsWith("CompileError", "variable late");
  }

  @Test
  void anInterruptWithoutACellDoesNothing() {
    session.evaluator.interrupt();
    session.cell("kept").shows("42");
  }
}
