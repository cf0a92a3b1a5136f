package tunwarden.config;

import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;
import tunwarden.vessel.Room;
import tunwarden.vessel.Site;

/** The {@code [site]} table. */
final class SiteReader {
  private SiteReader() {}

  static Site read(Section site) {
    Optional<Site> atAltitude =
        site.parsed("altitude", text -> Site.atAltitude(Quantities.parse(text, Kind.LENGTH)));
    Optional<Site> measured =
        site.parsed("air-pressure", text -> Site.measured(Texts.absolutePa(text)));
    OptionalDouble accuracy = site.quantity("air-pressure-accuracy", Texts::pressureDifferencePa);
    if (site.has("altitude") && site.has("air-pressure")) {
      site.problem("air-pressure", "write altitude or air-pressure, not both");
    }
    Site place = measured.or(() -> atAltitude).orElse(Site.SEA_LEVEL);
    if (accuracy.isPresent()) {
      place = new Site(place.ambientPaAbsolute(), accuracy.getAsDouble(), place.room());
    }
    Optional<Room> room = room(site);
    return room.isPresent() ? place.withRoom(room.get()) : place;
  }

  private static Optional<Room> room(Section site) {
    if (!site.has("room")) {
      return Optional.empty();
    }
    Section room = site.section("room");
    OptionalDouble volume = room.quantity("volume", Texts.of(Kind.VOLUME));
    OptionalDouble changes = room.quantity("air-changes", Texts.of(Kind.RATE));
    room.require("volume", "\"180 m3\"");
    if (volume.orElse(1) == 0) {
      room.problem("volume", "a room has a volume above zero");
    }
    room.close();
    return Optional.of(new Room(volume.orElse(1), changes.orElse(0)));
  }
}
