package whorl.mechanics.body.mesh;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * Reads a mesh of a million triangles from binary STL into mass, centre and inertia, and beside it
 * only the bytes of the same file. The first reading counts: a note reads its mesh once.
 */
public final class MeshBenchmark {
  private static final int ROUND = 1000;
  private static final int ALONG = 501;

  private MeshBenchmark() {}

  /** Prints the times of each round. */
  public static void main(String[] arguments) throws IOException {
    int rounds = arguments.length == 0 ? 5 : Integer.parseInt(arguments[0]);
    Path file = Files.createTempFile("sphere", ".stl");
    try {
      write(file);
      for (int round = 1; round <= rounds; round++) {
        long start = System.nanoTime();
        bytes(file);
        long read = System.nanoTime();
        long busy = processorTime();
        Mesh mesh = Mesh.read(file, 0.001);
        double inertia = mesh.shape().ofDensity(7850).ownInertia().zz();
        long done = System.nanoTime();
        double bytes = (read - start) / 1e6;
        double all = (done - read) / 1e6;
        double own = (processorTime() - busy) / 1e6;
        System.out.printf(
            Locale.ROOT,
            "%d: %d triangles in %.0f ms (processor time of the thread %.0f ms), their bytes in"
                + " %.0f ms; I_zz %.10g kg·m²%n",
            round,
            mesh.triangles(),
            all,
            own,
            bytes,
            inertia);
      }
    } finally {
      Files.delete(file);
    }
  }

  private static long processorTime() {
    return ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
  }

  private static void bytes(Path file) throws IOException {
    ByteBuffer buffer = ByteBuffer.allocate(1 << 18);
    try (FileChannel channel = FileChannel.open(file)) {
      while (channel.read(buffer.clear()) >= 0) {}
    }
  }

  /** A ball of a radius of 100 mm, a metre from the origin of the file. */
  private static void write(Path file) throws IOException {
    int count = 2 * ROUND * (ALONG - 1);
    ByteBuffer bytes = ByteBuffer.allocate(84 + 50 * count).order(ByteOrder.LITTLE_ENDIAN);
    bytes.putInt(80, count).position(84);
    for (int ring = 0; ring < ALONG; ring++) {
      for (int k = 0; k < ROUND; k++) {
        Vector3D a = at(ring, k);
        Vector3D b = at(ring, k + 1);
        Vector3D c = at(ring + 1, k + 1);
        Vector3D d = at(ring + 1, k);
        if (ring > 0) {
          put(bytes, a, b, c);
        }
        if (ring < ALONG - 1) {
          put(bytes, a, c, d);
        }
      }
    }
    Files.write(file, bytes.array());
  }

  private static Vector3D at(int ring, int k) {
    double latitude = Math.PI * ((double) ring / ALONG - 0.5);
    double longitude = 2 * Math.PI * (k % ROUND) / ROUND;
    double radius = ring == 0 || ring == ALONG ? 0 : 100 * Math.cos(latitude);
    return new Vector3D(
        1000 + radius * Math.cos(longitude),
        radius * Math.sin(longitude),
        100 * Math.sin(latitude));
  }

  private static void put(ByteBuffer bytes, Vector3D... corners) {
    bytes.position(bytes.position() + 12);
    for (Vector3D corner : corners) {
      for (double c : corner.toArray()) {
        bytes.putFloat((float) c);
      }
    }
    bytes.putShort((short) 0);
  }
}
