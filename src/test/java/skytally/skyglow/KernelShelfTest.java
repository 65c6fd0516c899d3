package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

@DisplayName("Kernels on disk")
class KernelShelfTest {

    private static final Atmosphere CLEAR = Atmosphere.atSeaLevel(Clearness.CLEAR);

    @TempDir
    Path directory;

    private final AtomicInteger made = new AtomicInteger();

    private KernelShelf shelf() {
        return new KernelShelf(directory, (air, progress) -> {
            made.incrementAndGet();
            return SkyglowKernel.solve(air, TestResolutions.TINY, progress);
        });
    }

    private static SkyglowKernel tiny() {
        return SkyglowKernel.solve(KernelGrid.node(1, 1), TestResolutions.TINY, share -> {});
    }

    private Path written() throws IOException {
        Path file = directory.resolve("one.kernel");
        KernelFile.write(tiny(), file);
        return file;
    }

    @Test
    void isReadAsItWasWritten() throws Exception {
        SkyglowKernel read = KernelFile.read(written(), KernelGrid.node(1, 1));
        assertThat(KernelFile.content(read)).isEqualTo(KernelFile.content(tiny()));
        try (Stream<Path> files = Files.list(directory)) {
            assertThat(files).as("nothing else is left").hasSize(1);
        }
    }

    @Test
    void anyChangedByteIsNoticed() throws IOException {
        Path file = written();
        byte[] sound = Files.readAllBytes(file);
        for (int i = 0; i < sound.length; i += 97) {
            byte[] changed = sound.clone();
            changed[i] ^= 1;
            Files.write(file, changed);
            assertThatThrownBy(() -> KernelFile.read(file, KernelGrid.node(1, 1)))
                    .as("byte %s", i)
                    .isInstanceOf(KernelFile.Unusable.class);
        }
    }

    @Test
    void aFileCutShortIsNoticed() throws IOException {
        Path file = written();
        byte[] sound = Files.readAllBytes(file);
        for (int length : new int[] {0, 3, 40, sound.length / 2, sound.length - 1}) {
            Files.write(file, Arrays.copyOf(sound, length));
            assertThatThrownBy(() -> KernelFile.read(file, KernelGrid.node(1, 1)))
                    .as("%s bytes", length)
                    .isInstanceOf(KernelFile.Unusable.class);
        }
    }

    @Test
    void aFileOfOtherAirIsNoticed() throws IOException {
        Path file = written();
        assertThatThrownBy(() -> KernelFile.read(file, KernelGrid.node(1, 2)))
                .isInstanceOf(KernelFile.Unusable.class)
                .hasMessage("it is of other air or other ground");
    }

    @Test
    void isFilledOnceAndReadAfterwards() throws IOException {
        List<Double> shares = new ArrayList<>();
        KernelShelf first = shelf();
        assertThat(first.isFull()).isFalse();
        first.fill(share -> {
            synchronized (shares) {
                shares.add(share);
            }
        });
        assertThat(first.isFull()).isTrue();
        assertThat(made).hasValue(KernelShelf.size());
        assertThat(shares).allMatch(share -> share > 0 && share <= 1).endsWith(1.0);

        KernelShelf second = shelf();
        second.fill(share -> {});
        assertThat(second.isFull()).isTrue();
        assertThat(made).as("all were read").hasValue(KernelShelf.size());
    }

    @Test
    void aDamagedFileIsMadeAgain() throws IOException {
        shelf().fill(share -> {});
        KernelShelf shelf = shelf();
        Path damaged = shelf.file(2, 3);
        byte[] sound = Files.readAllBytes(damaged);
        Files.writeString(damaged, "SKYK and nonsense", StandardCharsets.US_ASCII);
        made.set(0);
        shelf.fill(share -> {});
        assertThat(made).hasValue(1);
        assertThat(Files.readAllBytes(damaged)).isEqualTo(sound);
    }

    @Test
    void nothingIsFoundBeforeAllIsReady() throws IOException {
        KernelShelf shelf = shelf();
        assertThatThrownBy(() -> shelf.between(CLEAR, 0.15, 550))
                .isInstanceOf(IllegalStateException.class)
                .hasMessage("The kernels are being made: 0 of 20 are ready");
        shelf.fill(share -> {});
        assertThat(shelf.between(CLEAR, 0.15, 550)
                        .lit(UpwardShape.mattGround())
                        .higherOrders(Sightline.ofDegrees(5000, 0, 0, 0))[0])
                .isPositive();
    }

    @Test
    void stoppedHalfWayItKeepsWhatIsWhole() throws IOException {
        KernelShelf shelf = shelf();
        assertThatThrownBy(() -> shelf.fill(share -> {
                    if (share > 0.5) {
                        throw new CancellationException("enough");
                    }
                }))
                .isInstanceOf(CancellationException.class);
        assertThat(shelf.ready()).isBetween(9, 11);
        int before = made.get();
        shelf.fill(share -> {});
        assertThat(shelf.isFull()).isTrue();
        assertThat(made.get()).isLessThanOrEqualTo(before + KernelShelf.size() - 9);
    }
}
