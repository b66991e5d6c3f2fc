import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;

/// Puts the runnable image together: a Java runtime, the jars, ahead-of-time caches, the launcher.
///
/// Run by the build on the selected JDK as `BuildImage.java PROJECT TARGET JAR`, where
/// `TARGET/image-jars` holds the jars the program needs and `JAR` is its own. The image is
/// `TARGET/gnomon`. The runtime is made again only when the JDK has changed.
public final class BuildImage {
  private static final String REHEARSAL = "src/build/rehearsal.gnomon";
  private static final String MODULES = "java.base,java.logging,jdk.unsupported";

  private final Path project;
  private final Path jars;
  private final Path ownJar;
  private final Path image;

  private BuildImage(Path project, Path target, Path ownJar) {
    this.project = project;
    this.jars = target.resolve("image-jars");
    this.ownJar = ownJar;
    this.image = target.resolve("gnomon");
  }

  static void main(String[] arguments) throws IOException, InterruptedException {
    new BuildImage(Path.of(arguments[0]), Path.of(arguments[1]), Path.of(arguments[2])).build();
  }

  private void build() throws IOException, InterruptedException {
    linkRuntime();
    delete(image.resolve("lib"));
    Files.createDirectories(image.resolve("lib"));
    Files.createDirectories(image.resolve("bin"));
    List<String> names = copyJars();
    unpackTerminalLibraries();
    writeLauncher(names);
    for (String text : List.of("LICENSE", "THIRD-PARTY.md")) {
      copy(project.resolve(text), image.resolve(text));
    }
    rehearse("batch", List.of("-XX:TieredStopAtLevel=1"), names, List.of("run", REHEARSAL));
    rehearse("console", List.of(), names, List.of());
    recheckExamples();
  }

  private void linkRuntime() throws IOException, InterruptedException {
    Path runtime = image.resolve("runtime");
    Path stamp = image.resolve("runtime.jdk");
    String jdk =
        String.join("\n", System.getProperty("java.home"), Runtime.version() + "", MODULES);
    if (Files.exists(stamp) && Files.readString(stamp).equals(jdk)) {
      return;
    }
    delete(runtime);
    Files.createDirectories(image);
    List<String> command =
        List.of(
            Path.of(System.getProperty("java.home"), "bin", "jlink").toString(),
            "--add-modules",
            MODULES,
            "--strip-debug",
            "--no-header-files",
            "--no-man-pages",
            "--output",
            runtime.toString());
    Ended linking = run(command);
    if (linking.status() != 0) {
      System.err.println(linking.output());
      System.exit(1);
    }
    Files.writeString(stamp, jdk);
  }

  /// Copies the jars with the project's own first, and answers with their names in class path
  /// order.
  private List<String> copyJars() throws IOException {
    List<Path> all = new ArrayList<>();
    all.add(ownJar);
    try (var files = Files.list(jars)) {
      files.filter(file -> file.toString().endsWith(".jar")).sorted().forEach(all::add);
    }
    List<String> names = new ArrayList<>();
    for (Path jar : all) {
      String name = jar.equals(ownJar) ? "gnomon.jar" : jar.getFileName().toString();
      copy(jar, image.resolve("lib").resolve(name));
      names.add(name);
    }
    PlainSwitches.rewrite(image.resolve("lib/gnomon.jar"));
    return names;
  }

  /// Lays JLine's terminal libraries out beside the jars, where its loader looks first; without
  /// that it would unpack one into the temporary folder at every start.
  private void unpackTerminalLibraries() throws IOException {
    for (Path jar : jarsNamed("jline-native-")) {
      try (FileSystem contents = FileSystems.newFileSystem(jar)) {
        Path root = contents.getPath("org/jline/nativ");
        try (var files = Files.walk(root)) {
          for (Path file : files.filter(BuildImage::isTerminalLibrary).toList()) {
            Path copy = image.resolve("lib/native").resolve(root.relativize(file).toString());
            Files.createDirectories(copy.getParent());
            copy(file, copy);
          }
        }
      }
    }
  }

  private List<Path> jarsNamed(String start) throws IOException {
    try (var files = Files.list(jars)) {
      return files.filter(file -> file.getFileName().toString().startsWith(start)).toList();
    }
  }

  private static boolean isTerminalLibrary(Path file) {
    return Files.isRegularFile(file) && file.getFileName().toString().contains("jlinenative.");
  }

  private void writeLauncher(List<String> names) throws IOException {
    Path launcher = image.resolve("bin").resolve("gnomon");
    String text = Files.readString(project.resolve("src/launcher/gnomon"));
    Files.writeString(launcher, text.replace("@CLASSPATH@", classPath("$home", names)));
    Files.setPosixFilePermissions(launcher, PosixFilePermissions.fromString("rwxr-xr-x"));
  }

  private static String classPath(String home, List<String> names) {
    return names.stream().map(name -> home + "/lib/" + name).collect(Collectors.joining(":"));
  }

  /// Runs the program once over typical work and keeps what it loaded and linked. Statements of the
  /// rehearsal may fail, so their status does not count; without a cache gnomon only starts more
  /// slowly.
  private void rehearse(
      String cache, List<String> tuning, List<String> names, List<String> arguments)
      throws IOException, InterruptedException {
    Path file = image.resolve("lib").resolve(cache + ".aot");
    List<String> command = new ArrayList<>();
    command.add(image.resolve("runtime/bin/java").toString());
    command.addAll(tuning);
    command.addAll(List.of("-XX:+UseSerialGC", "-XX:AOTCacheOutput=" + file, "-Xlog:disable"));
    command.addAll(List.of("-Xss4m", "--enable-native-access=ALL-UNNAMED"));
    command.add("-Dlibrary.jline.path=" + image.resolve("lib/native"));
    command.add("--sun-misc-unsafe-memory-access=allow");
    command.addAll(List.of("-cp", classPath(image.toString(), names), "gnomon.launch.Main"));
    command.addAll(arguments);
    String output = arguments.isEmpty() ? Typist.converse(command, lines()) : run(command).output();
    if (!Files.exists(file)) {
      System.err.println(output);
      System.err.println("No " + cache + " cache was made; gnomon will start more slowly.");
    }
  }

  /// An image whose classes or caches change an answer must not be kept.
  private void recheckExamples() throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(image.resolve("bin/gnomon").toString());
    command.add("recheck");
    try (var files = Files.list(project.resolve("session-examples"))) {
      files.map(Path::toString).filter(f -> f.endsWith(".gnomon")).sorted().forEach(command::add);
    }
    Ended recheck = run(command);
    if (recheck.status() != 0) {
      System.err.println(recheck.output());
      System.exit(1);
    }
  }

  private List<String> lines() throws IOException {
    return Files.readAllLines(project.resolve(REHEARSAL));
  }

  private record Ended(int status, String output) {}

  private Ended run(List<String> command) throws IOException, InterruptedException {
    Process process =
        new ProcessBuilder(command).directory(project.toFile()).redirectErrorStream(true).start();
    process.getOutputStream().close();
    String output = new String(process.getInputStream().readAllBytes());
    return new Ended(process.waitFor(), output);
  }

  private static void copy(Path from, Path to) throws IOException {
    Files.copy(from, to, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.COPY_ATTRIBUTES);
  }

  private static void delete(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return;
    }
    try (var files = Files.walk(folder)) {
      for (Path file : files.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(file);
      }
    }
  }
}

/// Types lines at a console that runs on a pseudo-terminal, where the system has the command
/// `script` to make one; elsewhere the console gets a plain pipe.
final class Typist {
  private static final Duration PATIENCE = Duration.ofSeconds(10);
  private static final String PROMPT = "∟";

  private final Process console;
  private final StringBuilder seen = new StringBuilder();

  private Typist(Process console) {
    this.console = console;
  }

  /// Types the lines, one at each prompt, then a completion and the end; answers with what was
  /// shown.
  static String converse(List<String> command, List<String> lines)
      throws IOException, InterruptedException {
    Path state = Files.createTempDirectory("gnomon-rehearsal");
    ProcessBuilder builder = new ProcessBuilder(onTerminal(command)).redirectErrorStream(true);
    builder.environment().put("XDG_STATE_HOME", state.toString());
    builder.environment().put("TERM", "xterm-256color");
    builder.environment().put("LC_ALL", "C.UTF-8");
    Typist typist = new Typist(builder.start());
    Thread.ofPlatform().daemon().start(typist::watch);
    for (String line : lines) {
      typist.type(line + "\r");
    }
    typist.type("Del\t\u0003");
    typist.type("leave\r");
    if (!typist.console.waitFor(2, TimeUnit.MINUTES)) {
      typist.console.destroy();
    }
    return typist.shown();
  }

  private static List<String> onTerminal(List<String> command) {
    boolean linux = System.getProperty("os.name").equals("Linux");
    if (!linux || !Files.isExecutable(Path.of("/usr/bin/script"))) {
      return command;
    }
    String line =
        command.stream()
            .map(word -> "'" + word.replace("'", "'\\''") + "'")
            .collect(Collectors.joining(" "));
    return List.of("/usr/bin/script", "-qec", "stty rows 30 cols 100; " + line, "/dev/null");
  }

  private void type(String keys) throws IOException, InterruptedException {
    awaitPrompt();
    console.getOutputStream().write(keys.getBytes(StandardCharsets.UTF_8));
    console.getOutputStream().flush();
  }

  private synchronized void awaitPrompt() throws InterruptedException {
    long end = System.nanoTime() + PATIENCE.toNanos();
    while (seen.indexOf(PROMPT) < 0 && System.nanoTime() < end) {
      wait(100);
    }
    // What is drawn again after a key is let pass before the next line.
    wait(50);
    seen.setLength(0);
  }

  private void watch() {
    try (var reader = console.inputReader(StandardCharsets.UTF_8)) {
      char[] some = new char[4096];
      for (int count = reader.read(some); count >= 0; count = reader.read(some)) {
        see(new String(some, 0, count));
      }
    } catch (IOException over) {
      see("");
    }
  }

  private synchronized void see(String text) {
    seen.append(text);
    notifyAll();
  }

  private synchronized String shown() {
    return seen.toString();
  }
}
