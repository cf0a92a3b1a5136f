package tunwarden.journal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.TornTail;

/** What is put right when a data folder is opened after a crash. */
final class Repairs {
  private Repairs() {}

  /**
   * Cuts every plain file back to whole lines and removes files that were never finished.
   *
   * @return one sentence for each thing done
   */
  static List<String> of(Disk disk, DataFolder folder) throws IOException {
    List<String> done = new ArrayList<>();
    List<Path> directories = new ArrayList<>();
    directories.add(folder.journal());
    directories.addAll(disk.list(folder.readings()));
    directories.addAll(disk.list(folder.estimates()));
    for (Path state : List.of(folder.state(), folder.estimatorState())) {
      disk.delete(state.resolveSibling(state.getFileName() + ".new"));
    }
    for (Path directory : directories) {
      for (Path file : disk.list(directory)) {
        String name = file.getFileName().toString();
        if (name.endsWith(".new")) {
          disk.delete(file);
          done.add(name + " was never finished and is removed.");
        } else if (name.endsWith(".jsonl") || DataFolder.isDayFile(file, ".csv")) {
          TornTail.repair(disk, file).map(TornTail.Repair::text).ifPresent(done::add);
        }
      }
    }
    return done;
  }
}
