package slantfall.figure;

import java.util.EnumMap;
import java.util.Map;

/** Colours by role, for light and dark screens and for paper. On paper every pair that meets differs in grey too. */
public enum Palette {
    LIGHT("#ffffff,#1d2733,#66717f,#8b95a1,#e6eaee,#3d4753,#9a5b13,#bfe3ea,#11747f,#0b6e75,#9a3412,#5b4fa3,#1f5fa8,#b42318,"
            + "#3f4a57,#0f766e,#7a8491,#1a7f37,#9a6700,#b42318,#66717f"),
    DARK("#161b22,#e6edf3,#97a3b0,#6b7683,#2a313a,#c3ccd6,#e3a857,#1d4a54,#5cc8d3,#5cc8d3,#f0906a,#b3a6ff,#79b8ff,#ff8278,"
            + "#c3ccd6,#2bb3a8,#97a3b0,#4cc26b,#e3b341,#ff8278,#97a3b0"),
    PAPER("#ffffff,#000000,#444444,#666666,#dddddd,#222222,#6b3d00,#d5e9ee,#134e57,#0a4f55,#7a2a0c,#4a3f8a,#123f75,#8c1c13,"
            + "#222222,#0f5a55,#666666,#14602a,#7a5200,#8c1c13,#555555");

    private final Map<Ink, String> colours = new EnumMap<>(Ink.class);

    Palette(String list) {
        String[] all = list.split(",");
        Ink[] inks = Ink.values();
        if (all.length != inks.length) {
            throw new IllegalStateException("palette " + name() + " has " + all.length + " colours for " + inks.length + " inks");
        }
        for (int i = 0; i < inks.length; i++) {
            colours.put(inks[i], all[i]);
        }
    }

    /** A colour for every ink, as #rrggbb. */
    public Map<Ink, String> colours() {
        return Map.copyOf(colours);
    }
}
