package skytally.guide;

import java.util.List;
import skytally.notation.QuantityFormat;
import skytally.spectrum.SpectralClass;
import skytally.spectrum.SpectralClasses;

/**
 * A spectral class.
 *
 * @param id    its name in files
 * @param label in words
 * @param ratio S/P, scotopic over photopic light
 * @param from  where its spectrum is from
 */
record SpectrumRow(String id, String label, String ratio, String from) {

    static List<SpectrumRow> all() {
        return SpectralClasses.all().stream().map(SpectrumRow::of).toList();
    }

    private static SpectrumRow of(SpectralClass kind) {
        return new SpectrumRow(
                kind.id(),
                kind.label(),
                QuantityFormat.decimals(kind.spectrum().scotopicPhotopicRatio(), 2)
                        .plain(),
                SpectralClasses.origin(kind.id()));
    }
}
