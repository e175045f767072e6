package clipramp.sizing;
import clipramp.files.*;
import clipramp.units.*;
import java.util.*;
import java.nio.file.*;
public class Tryout {
  public static void main(String[] a) throws Exception {
    ProfileLibrary lib = ProfileLibrary.shipped();
    for (int rep = 0; rep < 2; rep++)
    for (String f : a) {
      long t0 = System.nanoTime();
      PartialDesign p = PartialDesign.read(Source.of(Path.of(f)), Set.of(), Set.of(), lib);
      SizingRequest r = p.request(lib, PreferredSeries.E24);
      long t1 = System.nanoTime();
      SizingAnswer s = Sizing.propose(r);
      long t2 = System.nanoTime();
      System.out.printf("%s read %.0f ms size %.0f ms  %s yield %.2f dead %.2f W %.2f cand %d%n", f, (t1-t0)/1e6, (t2-t1)/1e6, s.outcome(), s.yield(), s.deadTravel(), s.watts(), s.candidates());
      if (rep == 1) {
        for (OpenPart q : p.open()) System.out.println("   " + q.key() + ": " + SizedText.value(q, s.design()).orElse("-"));
        s.check().margins().stream().limit(7).forEach(m -> System.out.println("     " + m.verdict() + " " + m.id() + " " + m.demand() + " " + m.offered() + " " + m.ratio() + " " + m.condition()));
        s.cornerFailures().forEach(m -> System.out.println("     corner " + m.id() + " " + m.demand() + " " + m.offered()));
        s.conflicts().forEach(c -> System.out.println("     conflict " + c));
      }
    }
  }
}
