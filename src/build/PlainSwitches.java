import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.classfile.ClassBuilder;
import java.lang.classfile.ClassFile;
import java.lang.classfile.ClassHierarchyResolver;
import java.lang.classfile.ClassModel;
import java.lang.classfile.ClassTransform;
import java.lang.classfile.CodeBuilder;
import java.lang.classfile.CodeElement;
import java.lang.classfile.CodeTransform;
import java.lang.classfile.MethodModel;
import java.lang.classfile.Opcode;
import java.lang.classfile.instruction.InvokeDynamicInstruction;
import java.lang.constant.ClassDesc;
import java.lang.constant.ConstantDesc;
import java.lang.constant.DirectMethodHandleDesc;
import java.lang.constant.MethodTypeDesc;
import java.lang.reflect.AccessFlag;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/// Spells out the switches over types in the classes of a jar as tests of one type after the other.
///
/// The compiler leaves the choice among the cases of such a switch to a class that the runtime
/// makes when the switch is first reached. The ahead-of-time cache does not keep these classes, so
/// each one costs about a millisecond at every start. The method written here in its place chooses
/// the same case: by `java.lang.runtime.SwitchBootstraps.typeSwitch`, the answer is −1 for null,
/// else the first index from `restart` on whose class the value is an instance of, else the number
/// of labels. Switches with labels other than classes are left as they are.
final class PlainSwitches {
  private static final ClassDesc BOOTSTRAPS = ClassDesc.of("java.lang.runtime.SwitchBootstraps");

  private final ClassFile classFile;
  private final ClassModel model;
  private final Map<Choice, String> methods = new HashMap<>();

  private PlainSwitches(ClassFile classFile, ClassModel model) {
    this.classFile = classFile;
    this.model = model;
  }

  /// What a switch chooses from, and the descriptor it is called by.
  private record Choice(MethodTypeDesc type, List<ClassDesc> labels) {}

  /// Rewrites the classes of a jar in place.
  static void rewrite(Path jar) throws IOException {
    try (FileSystem contents = FileSystems.newFileSystem(jar);
        var files = Files.walk(contents.getPath("/"))) {
      ClassFile classFile =
          ClassFile.of(ClassFile.ClassHierarchyResolverOption.of(types(contents)));
      for (Path file : files.filter(f -> f.toString().endsWith(".class")).toList()) {
        byte[] old = Files.readAllBytes(file);
        PlainSwitches rewriting = new PlainSwitches(classFile, classFile.parse(old));
        byte[] changed = rewriting.rewritten();
        if (!rewriting.methods.isEmpty()) {
          Files.write(file, changed);
        }
      }
    }
  }

  private static ClassHierarchyResolver types(FileSystem contents) {
    ClassHierarchyResolver own =
        ClassHierarchyResolver.ofResourceParsing(
            type -> {
              String name = type.descriptorString();
              Path file = contents.getPath("/" + name.substring(1, name.length() - 1) + ".class");
              try {
                return Files.exists(file) ? Files.newInputStream(file) : null;
              } catch (IOException failure) {
                throw new UncheckedIOException(failure);
              }
            });
    return own.orElse(ClassHierarchyResolver.defaultResolver());
  }

  private byte[] rewritten() {
    ClassTransform code = ClassTransform.transformingMethodBodies(this::switches, calls());
    return classFile.transformClass(model, code.andThen(ClassTransform.endHandler(this::declare)));
  }

  private boolean switches(MethodModel method) {
    return method.code().stream()
        .flatMap(code -> code.elementStream())
        .anyMatch(element -> element instanceof InvokeDynamicInstruction call && plain(call));
  }

  private CodeTransform calls() {
    return (CodeBuilder builder, CodeElement element) -> {
      if (element instanceof InvokeDynamicInstruction call && plain(call)) {
        Choice choice = choice(call);
        String name = methods.computeIfAbsent(choice, _ -> "typeSwitch$" + methods.size());
        boolean onInterface = model.flags().has(AccessFlag.INTERFACE);
        builder.invokestatic(model.thisClass().asSymbol(), name, choice.type(), onInterface);
      } else {
        builder.with(element);
      }
    };
  }

  private static boolean plain(InvokeDynamicInstruction call) {
    DirectMethodHandleDesc bootstrap = call.bootstrapMethod();
    return bootstrap.owner().equals(BOOTSTRAPS)
        && bootstrap.methodName().equals("typeSwitch")
        && call.bootstrapArgs().stream().allMatch(ClassDesc.class::isInstance);
  }

  private static Choice choice(InvokeDynamicInstruction call) {
    List<ClassDesc> labels = new ArrayList<>();
    for (ConstantDesc label : call.bootstrapArgs()) {
      labels.add((ClassDesc) label);
    }
    return new Choice(call.typeSymbol(), labels);
  }

  private void declare(ClassBuilder builder) {
    int flags = ClassFile.ACC_PRIVATE | ClassFile.ACC_STATIC | ClassFile.ACC_SYNTHETIC;
    methods.forEach(
        (choice, name) ->
            builder.withMethodBody(name, choice.type(), flags, code -> choose(choice, code)));
  }

  private static void choose(Choice choice, CodeBuilder code) {
    code.aload(0).ifThen(Opcode.IFNULL, none -> none.loadConstant(-1).ireturn());
    for (int index = 0; index < choice.labels().size(); index++) {
      int at = index;
      code.iload(1).loadConstant(at);
      code.ifThen(
          Opcode.IF_ICMPLE,
          reached ->
              reached
                  .aload(0)
                  .instanceOf(choice.labels().get(at))
                  .ifThen(found -> found.loadConstant(at).ireturn()));
    }
    code.loadConstant(choice.labels().size()).ireturn();
  }
}
