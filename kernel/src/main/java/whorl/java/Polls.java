package whorl.java;

import java.util.HashSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.objectweb.asm.ClassReader;
import org.objectweb.asm.ClassVisitor;
import org.objectweb.asm.ClassWriter;
import org.objectweb.asm.Label;
import org.objectweb.asm.MethodVisitor;
import org.objectweb.asm.Opcodes;
import org.objectweb.asm.Type;

/**
 * Puts a call of {@link Interruption#poll} at the beginning of every method of a class and before
 * every jump back, so that neither a loop nor a recursion can go on without it.
 */
final class Polls {
  private static final int ASM = Opcodes.ASM9;
  private static final String OWNER = Type.getInternalName(Interruption.class);
  private static final String NAME = "poll";
  private static final String DESCRIPTOR = "()V";

  private Polls() {}

  /** The class with polls in it; as it is, if it is of a format newer than we can read. */
  static byte[] in(byte[] bytecode) {
    ClassReader reader;
    try {
      reader = new ClassReader(bytecode);
    } catch (IllegalArgumentException newer) {
      return bytecode;
    }
    // A call without arguments and result needs no place on the stack and changes no frame.
    var writer = new ClassWriter(reader, 0);
    reader.accept(
        new ClassVisitor(ASM, writer) {
          @Override
          public @Nullable MethodVisitor visitMethod(
              int access,
              String name,
              String descriptor,
              @Nullable String signature,
              String @Nullable [] exceptions) {
            return new Weaver(super.visitMethod(access, name, descriptor, signature, exceptions));
          }
        },
        0);
    return writer.toByteArray();
  }

  private static final class Weaver extends MethodVisitor {
    private final Set<Label> passed = new HashSet<>();

    Weaver(@Nullable MethodVisitor next) {
      super(ASM, next);
    }

    @Override
    public void visitCode() {
      super.visitCode();
      poll();
    }

    @Override
    public void visitLabel(Label label) {
      passed.add(label);
      super.visitLabel(label);
    }

    @Override
    public void visitJumpInsn(int opcode, Label label) {
      pollBeforeJumpTo(label);
      super.visitJumpInsn(opcode, label);
    }

    @Override
    public void visitTableSwitchInsn(int min, int max, Label otherwise, Label... labels) {
      pollBeforeJumpTo(otherwise, labels);
      super.visitTableSwitchInsn(min, max, otherwise, labels);
    }

    @Override
    public void visitLookupSwitchInsn(Label otherwise, int[] keys, Label[] labels) {
      pollBeforeJumpTo(otherwise, labels);
      super.visitLookupSwitchInsn(otherwise, keys, labels);
    }

    private void pollBeforeJumpTo(Label label, Label... others) {
      boolean back = passed.contains(label);
      for (Label other : others) {
        back |= passed.contains(other);
      }
      if (back) {
        poll();
      }
    }

    private void poll() {
      super.visitMethodInsn(Opcodes.INVOKESTATIC, OWNER, NAME, DESCRIPTOR, false);
    }
  }
}
