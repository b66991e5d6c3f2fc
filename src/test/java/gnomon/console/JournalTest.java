package gnomon.console;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class JournalTest {
  @TempDir Path scratch;
  private StateFolder state;

  @BeforeEach
  void makeTheFolders() throws IOException {
    state = StateFolder.of(Map.of("XDG_STATE_HOME", scratch.toString()));
    state.create();
  }

  @Test
  void theStateFolderFollowsTheDesktopSpecification() {
    assertEquals(scratch.resolve("gnomon"), state.path());
    assertEquals(
        Path.of("/home/mason/.local/state/gnomon"),
        StateFolder.of(Map.of("HOME", "/home/mason")).path());
    assertEquals(
        Path.of("/home/mason/.local/state/gnomon"),
        StateFolder.of(Map.of("HOME", "/home/mason", "XDG_STATE_HOME", "relative")).path());
  }

  @Test
  void aRunningSessionIsNotLeftBehind() throws IOException {
    try (Journal journal = Journal.begin(state)) {
      journal.add("let a = 1");
      assertEquals(List.of(), Journal.leftBehind(state));
      assertEquals("let a = 1\n", Files.readString(only(state.journals())));
    }
  }

  @Test
  void anEndedSessionLeavesNothing() throws IOException {
    Journal.begin(state).close();
    try (var files = Files.list(state.journals())) {
      assertFalse(files.findAny().isPresent());
    }
  }

  @Test
  void aKilledSessionIsLeftBehindUnlessItWasEmpty() throws IOException {
    Path full = Files.writeString(state.journals().resolve("20260101-101010-1.gnomon"), "x\n");
    Path empty = Files.createFile(state.journals().resolve("20260101-101011-2.gnomon"));
    assertEquals(List.of(full), Journal.leftBehind(state));
    assertFalse(Files.exists(empty));
  }

  private static Path only(Path folder) throws IOException {
    try (var files = Files.list(folder)) {
      List<Path> all = files.toList();
      assertEquals(1, all.size());
      return all.getFirst();
    }
  }
}
