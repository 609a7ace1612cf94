package whorl.install;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import whorl.notebook.NoteFileException;

/** Puts both kernels into a folder of kernels: all of it, or nothing. */
public final class Installation {
  private final Path kernels;
  private final List<KernelFolder> folders;

  /**
   * An installation that is not done yet.
   *
   * @param kernels the folder of kernels, made if it is not there
   * @param name of the kernel that begins in the sheet language
   * @param java how Jupyter is to start the JVM
   */
  public Installation(Path kernels, String name, JavaCommand java) {
    this.kernels = kernels.toAbsolutePath().normalize();
    folders =
        Kernelspec.both(name).stream()
            .map(spec -> new KernelFolder(this.kernels, spec, java))
            .toList();
  }

  /**
   * Installs the program.
   *
   * @return the folders of the kernels, each with what people choose it by
   */
  public Map<Path, String> install(Program program) throws NoteFileException {
    try {
      requireFolders();
      for (KernelFolder folder : folders) {
        folder.prepare(program);
      }
      for (KernelFolder folder : folders) {
        folder.commit();
      }
    } catch (NoteFileException e) {
      throw e;
    } catch (IOException e) {
      throw NoteFileException.unwritten(kernels, e);
    } finally {
      folders.forEach(KernelFolder::discardIfUnused);
    }
    var written = new TreeMap<Path, String>();
    folders.forEach(folder -> written.put(folder.path(), folder.spec().title()));
    return written;
  }

  /** Of a file that stands where a folder should, the system says little. */
  private void requireFolders() throws NoteFileException {
    Path existing = kernels;
    while (existing != null && !Files.exists(existing)) {
      existing = existing.getParent();
    }
    if (existing != null && !Files.isDirectory(existing)) {
      throw new NoteFileException(
          existing + " is not a folder, so that no kernel can be put into " + kernels);
    }
  }
}
