package tunwarden.app;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import tunwarden.report.Reporter;
import tunwarden.report.story.Chapter;
import tunwarden.units.BadInputException;

/** Reports on all vessels of a folder, one vessel a task, as many at a time as there are cores. */
final class Fleet {
  private final Reporter reporter;
  private final Outputs outputs;
  private final PrintWriter err;

  /**
   * Folders that take one file for each vessel.
   *
   * @param json reports as JSON
   * @param html reports as pages
   * @param series series, each in a folder named {@code vessel=ID} as engines read partitions
   */
  record Outputs(Optional<Path> json, Optional<Path> html, Optional<Path> series) {}

  /**
   * A vessel that could be found, or the reason why not.
   *
   * @param name what it is called
   * @param source its logs
   */
  record Member(String name, Callable<Reporter.Source> source) {}

  Fleet(Reporter reporter, Outputs outputs, PrintWriter err) {
    this.reporter = reporter;
    this.outputs = outputs;
    this.err = err;
  }

  /** Reads every vessel; a failure of one is its line and stops no other. */
  List<FleetLine> read(List<Member> members) throws IOException {
    ExecutorService tasks =
        Executors.newFixedThreadPool(Runtime.getRuntime().availableProcessors());
    try {
      List<Future<FleetLine>> running = new ArrayList<>();
      members.forEach(member -> running.add(tasks.submit(() -> line(member))));
      List<FleetLine> lines = new ArrayList<>();
      for (Future<FleetLine> each : running) {
        lines.add(each.get());
      }
      return lines;
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IOException("the reports were interrupted", stopped);
    } catch (ExecutionException unforeseen) {
      throw new IllegalStateException(unforeseen.getCause());
    } finally {
      tasks.shutdownNow();
    }
  }

  private FleetLine line(Member member) throws Exception {
    try {
      Chapter chapter = read(member.name(), member.source().call());
      write(outputs.json(), member.name() + ".json", Reporter.json(List.of(chapter)));
      if (outputs.html().isPresent()) {
        write(outputs.html(), member.name() + ".html", Reporter.html(List.of(chapter)));
      }
      synchronized (err) {
        chapter.notes().forEach(note -> err.println("note: " + member.name() + ": " + note));
      }
      return FleetLine.of(member.name(), chapter.analysis());
    } catch (BadInputException bad) {
      return FleetLine.failed(member.name(), bad.getMessage());
    } catch (IOException | UncheckedIOException failed) {
      return FleetLine.failed(
          member.name(), "it cannot be read or written: " + failed.getMessage());
    }
  }

  private Chapter read(String name, Reporter.Source source) throws IOException {
    if (outputs.series().isEmpty()) {
      return reporter.read(source, Optional.empty(), rows -> {});
    }
    Path part = Files.createDirectories(outputs.series().get().resolve("vessel=" + name));
    try (Writer file = Files.newBufferedWriter(part.resolve("series.csv"))) {
      return reporter.read(source, Optional.of(file), rows -> {});
    }
  }

  private static void write(Optional<Path> folder, String name, String text) throws IOException {
    if (folder.isPresent()) {
      Files.writeString(Files.createDirectories(folder.get()).resolve(name), text);
    }
  }
}
