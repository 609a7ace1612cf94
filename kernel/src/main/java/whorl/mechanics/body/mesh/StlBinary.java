package whorl.mechanics.body.mesh;

import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.ReadableByteChannel;

/**
 * Binary STL: a heading of 80 bytes, the number of triangles, and for each triangle its normal,
 * three corners as floats and two bytes more; little-endian. Normals are not used: the order of the
 * corners says which side is outside.
 */
final class StlBinary {
  static final int HEAD = 84;
  static final int RECORD = 50;

  private static final int AT_A_TIME = 4096;

  private StlBinary() {}

  /** The number of triangles that the head of a file announces. */
  static long triangles(byte[] head) {
    return Integer.toUnsignedLong(
        ByteBuffer.wrap(head).order(ByteOrder.LITTLE_ENDIAN).getInt(HEAD - 4));
  }

  /** Whether a file of a size in bytes holds as many triangles as it announces. */
  static boolean fits(long triangles, long size) {
    return size == HEAD + RECORD * triangles;
  }

  /** Reads triangles from behind the head. */
  static Surface read(ReadableByteChannel channel, int count) throws IOException {
    Triangles triangles = new Triangles(count);
    ByteBuffer buffer = ByteBuffer.allocate(RECORD * AT_A_TIME).order(ByteOrder.LITTLE_ENDIAN);
    for (int done = 0; done < count; done += AT_A_TIME) {
      buffer.clear().limit(RECORD * Math.min(AT_A_TIME, count - done));
      fill(channel, buffer);
      add(buffer, triangles);
    }
    return triangles.surface();
  }

  private static void fill(ReadableByteChannel channel, ByteBuffer buffer) throws IOException {
    while (buffer.hasRemaining()) {
      if (channel.read(buffer) < 0) {
        throw new EOFException("the file became shorter while it was read");
      }
    }
    buffer.flip();
  }

  private static void add(ByteBuffer buffer, Triangles triangles) {
    for (int at = 12; at < buffer.limit(); at += RECORD) {
      int a =
          triangles.vertex(buffer.getFloat(at), buffer.getFloat(at + 4), buffer.getFloat(at + 8));
      int b =
          triangles.vertex(
              buffer.getFloat(at + 12), buffer.getFloat(at + 16), buffer.getFloat(at + 20));
      int c =
          triangles.vertex(
              buffer.getFloat(at + 24), buffer.getFloat(at + 28), buffer.getFloat(at + 32));
      triangles.add(a, b, c);
    }
  }
}
