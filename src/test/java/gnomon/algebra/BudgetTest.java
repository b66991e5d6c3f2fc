package gnomon.algebra;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import gnomon.number.Rational;
import java.time.Duration;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Test;

class BudgetTest {

  private static Object spin() {
    while (true) {
      Budget.checkpoint();
    }
  }

  @Test
  void workWithinTheBudgetHandsBackItsResult() {
    Budget budget = Budget.of(Duration.ofMinutes(5), 1_000);
    String result =
        budget.run(
            () -> {
              Budget.checkpoint();
              Budget.charge(1_000);
              return "done";
            });
    assertEquals("done", result);
  }

  @Test
  void anEstimateAboveTheLimitIsRefusedAtOnce() {
    Budget budget = Budget.of(Duration.ofMinutes(5), 1_000_000);
    Halt halt = assertThrows(Halt.class, () -> budget.run(() -> Rational.TWO.power(1_000_000_000)));
    assertEquals(Halt.Cause.SIZE, halt.cause());
    assertTrue(halt.detail() > 1_000_000);
  }

  @Test
  void longIntegersAreChargedMoreThanTheirLength() {
    Budget budget = Budget.of(Duration.ofMinutes(5), 1_000_000);
    budget.run(
        () -> {
          Budget.charge(100_000);
          return 0;
        });
    for (long words : new long[] {100_000, 1L << 40, Long.MAX_VALUE}) {
      assertThrows(
          Halt.class,
          () ->
              budget.run(
                  () -> {
                    Budget.chargeInteger(words);
                    return 0;
                  }));
    }
  }

  @Test
  void workStopsWhenItsTimeIsUp() {
    Budget budget = Budget.of(Duration.ofMillis(20), Long.MAX_VALUE);
    Halt halt = assertThrows(Halt.class, () -> budget.run(BudgetTest::spin));
    assertEquals(Halt.Cause.TIME, halt.cause());
    assertEquals(20, halt.detail());
  }

  @Test
  void cancellingFromAnotherThreadStopsTheWork() throws InterruptedException {
    Budget budget = Budget.unlimited();
    CountDownLatch started = new CountDownLatch(1);
    AtomicReference<Halt> halt = new AtomicReference<>();
    Thread worker =
        Thread.ofPlatform()
            .start(
                () ->
                    halt.set(
                        assertThrows(
                            Halt.class,
                            () ->
                                budget.run(
                                    () -> {
                                      started.countDown();
                                      return spin();
                                    }))));
    started.await();
    budget.cancel();
    worker.join();
    assertTrue(budget.isCancelled());
    assertEquals(Halt.Cause.CANCELLED, halt.get().cause());
  }

  @Test
  void theInnerBudgetIsTheOneInForce() {
    Budget outer = Budget.of(Duration.ofMinutes(5), 10);
    Budget inner = Budget.of(Duration.ofMinutes(5), 100);
    String result =
        outer.run(
            () ->
                inner.run(
                    () -> {
                      Budget.charge(50);
                      return "inside";
                    }));
    assertEquals("inside", result);
    assertThrows(
        Halt.class,
        () ->
            outer.run(
                () -> {
                  Budget.charge(50);
                  return "outside";
                }));
  }

  @Test
  void outsideAnyBudgetNothingIsCharged() {
    Budget.checkpoint();
    Budget.charge(Long.MAX_VALUE);
    assertEquals(Rational.of(1024), Rational.TWO.power(10));
  }

  @Test
  void refusalsCarryTheirDataAndNoTrace() {
    Refusal refusal = assertThrows(Refusal.class, Rational.ZERO::inverse);
    assertEquals(Reason.DIVISION_BY_ZERO, refusal.reason());
    assertEquals(0, refusal.getStackTrace().length);
  }
}
