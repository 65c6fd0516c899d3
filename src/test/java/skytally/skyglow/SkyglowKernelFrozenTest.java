package skytally.skyglow;

import static org.assertj.core.api.Assertions.assertThat;

import java.security.MessageDigest;
import java.util.HexFormat;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import skytally.atmosphere.Atmosphere;
import skytally.atmosphere.Clearness;

/**
 * Our own digits, all of them. They must be the same on every machine; if a change of the method moves one, raise
 * {@link SkyglowKernel#METHOD}, so that kernels kept by people are made again, and say in the commit by how much.
 */
@DisplayName("Digits of the kernel")
class SkyglowKernelFrozenTest {

    @Test
    void areTheSameToTheLast() throws Exception {
        SkyglowKernel kernel = SkyglowKernel.solve(
                LayeredAir.of(
                        Atmosphere.atSeaLevel(Clearness.CLEAR), new double[] {0.15, 0.3}, new double[] {470, 580}),
                TestResolutions.COARSE,
                share -> {});
        byte[] digest = MessageDigest.getInstance("SHA-256").digest(KernelFile.content(kernel));
        assertThat(SkyglowKernel.METHOD).isEqualTo("successive-orders-1");
        assertThat(HexFormat.of().formatHex(digest))
                .isEqualTo("fe0e112b6ad5efa2a7e6d8d21559e0953b2a44f5d3886917cee0c04ad38b3a97");
    }
}
