import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;

/// Puts the runnable image together: a Java runtime, the jars, ahead-of-time caches, the launcher.
///
/// Run by the build on the selected JDK as `BuildImage.java PROJECT TARGET JAR`, where
/// `TARGET/image-jars` holds the jars the program needs and `JAR` is its own. The image is
/// `TARGET/gnomon`. The runtime is made again only when the JDK has changed.
public final class BuildImage {
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
    writeLauncher(names);
    for (String text : List.of("LICENSE", "THIRD-PARTY.md")) {
      copy(project.resolve(text), image.resolve(text));
    }
    rehearse("console", List.of("-XX:+UseSerialGC"), names);
    rehearse("batch", List.of("-XX:+UseSerialGC", "-XX:TieredStopAtLevel=1"), names);
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
    run(
        List.of(
            Path.of(System.getProperty("java.home"), "bin", "jlink").toString(),
            "--add-modules",
            MODULES,
            "--strip-debug",
            "--no-header-files",
            "--no-man-pages",
            "--output",
            runtime.toString()));
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
    return names;
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

  /// Runs the program once over typical work and keeps what it loaded and linked.
  private void rehearse(String cache, List<String> tuning, List<String> names)
      throws IOException, InterruptedException {
    List<String> command = new ArrayList<>();
    command.add(image.resolve("runtime/bin/java").toString());
    command.addAll(tuning);
    command.add("-XX:AOTCacheOutput=" + image.resolve("lib").resolve(cache + ".aot"));
    command.add("-Xlog:disable");
    command.add("-Xss4m");
    command.add("--enable-native-access=ALL-UNNAMED");
    command.add("--sun-misc-unsafe-memory-access=allow");
    command.add("-cp");
    command.add(classPath(image.toString(), names));
    command.add("gnomon.launch.Rehearsal");
    command.add(cache);
    command.add(project.resolve("src/build/rehearsal.gnomon").toString());
    run(command);
  }

  private static void run(List<String> command) throws IOException, InterruptedException {
    Process process = new ProcessBuilder(command).redirectErrorStream(true).start();
    process.getOutputStream().close();
    String output = new String(process.getInputStream().readAllBytes());
    int status = process.waitFor();
    if (status != 0) {
      System.err.println(String.join(" ", command));
      System.err.println(output);
      System.exit(1);
    }
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
