package pinchoff.kernel.eval;

import java.util.HashSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.ClassWriter;
import org.objectweb.asm.Handle;
import org.objectweb.asm.Label;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;

/**
 * Adds to a cell's compiled class what lets it be stopped: a call of {@link CellGuard#check} at the
 * start of each method and before each backward jump. Calls that would end the process go to the
 * guard instead.
 *
 * <p>The added calls take nothing from the stack and leave nothing on it, so the stack map frames
 * stay as they are.
 */
final class InterruptWeaver {
  private static final String GUARD = "pinchoff/kernel/eval/CellGuard";
  private static final String SYSTEM = "java/lang/System";
  private static final String RUNTIME = "java/lang/Runtime";

  private InterruptWeaver() {}

  static byte[] weave(byte[] classFile) {
    ClassReader reader = new ClassReader(classFile);
    ClassWriter writer = new ClassWriter(reader, 0);
    reader.accept(new Methods(writer), 0);
    return writer.toByteArray();
  }

  private static final class Methods extends ClassVisitor {
    Methods(ClassVisitor next) {
      super(Opcodes.ASM9, next);
    }

    @Override
    public MethodVisitor visitMethod(
        int access,
        String name,
        String descriptor,
        @Nullable String signature,
        String @Nullable [] exceptions) {
      return new Code(super.visitMethod(access, name, descriptor, signature, exceptions));
    }
  }

  private static final class Code extends MethodVisitor {
    private final Set<Label> behind = new HashSet<>();

    Code(MethodVisitor next) {
      super(Opcodes.ASM9, next);
    }

    @Override
    public void visitCode() {
      super.visitCode();
      check();
    }

    @Override
    public void visitLabel(Label label) {
      behind.add(label);
      super.visitLabel(label);
    }

    @Override
    public void visitJumpInsn(int opcode, Label target) {
      checkBefore(target);
      super.visitJumpInsn(opcode, target);
    }

    @Override
    public void visitTableSwitchInsn(int min, int max, Label otherwise, Label... targets) {
      checkBefore(otherwise, targets);
      super.visitTableSwitchInsn(min, max, otherwise, targets);
    }

    @Override
    public void visitLookupSwitchInsn(Label otherwise, int[] keys, Label[] targets) {
      checkBefore(otherwise, targets);
      super.visitLookupSwitchInsn(otherwise, keys, targets);
    }

    @Override
    public void visitMethodInsn(
        int opcode, String owner, String name, String descriptor, boolean onInterface) {
      if (endsProcess(owner, name, descriptor)) {
        super.visitMethodInsn(
            Opcodes.INVOKESTATIC, GUARD, name, guardDescriptor(owner, descriptor), false);
      } else {
        super.visitMethodInsn(opcode, owner, name, descriptor, onInterface);
      }
    }

    @Override
    public void visitInvokeDynamicInsn(
        String name, String descriptor, Handle bootstrap, Object... arguments) {
      Object[] guarded = arguments.clone();
      for (int i = 0; i < guarded.length; i++) {
        if (guarded[i] instanceof Handle h && endsProcess(h.getOwner(), h.getName(), h.getDesc())) {
          String target = guardDescriptor(h.getOwner(), h.getDesc());
          guarded[i] = new Handle(Opcodes.H_INVOKESTATIC, GUARD, h.getName(), target, false);
        }
      }
      super.visitInvokeDynamicInsn(name, descriptor, bootstrap, guarded);
    }

    private static boolean endsProcess(String owner, String name, String descriptor) {
      return descriptor.equals("(I)V")
          && ((owner.equals(SYSTEM) && name.equals("exit"))
              || (owner.equals(RUNTIME) && (name.equals("exit") || name.equals("halt"))));
    }

    private static String guardDescriptor(String owner, String descriptor) {
      return owner.equals(RUNTIME) ? "(L" + RUNTIME + ";I)V" : descriptor;
    }

    private void checkBefore(Label target, Label... more) {
      boolean backwards = behind.contains(target);
      for (Label label : more) {
        backwards |= behind.contains(label);
      }
      if (backwards) {
        check();
      }
    }

    private void check() {
      super.visitMethodInsn(Opcodes.INVOKESTATIC, GUARD, "check", "()V", false);
    }
  }
}
