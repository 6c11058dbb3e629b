package plusward.exchange;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import plusward.exchange.Refusals.Cell;
import plusward.exchange.Refusals.Place;

/** The text of a file: UTF-8, with or without a byte order mark, and nothing else. */
final class SheetText {

    private static final byte[] ZIPPED_WORKBOOK = {'P', 'K', 3, 4};
    private static final byte[] OLD_WORKBOOK = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0};

    private SheetText() {}

    /** The text without its byte order mark; absent, and refused, when the file is not UTF-8. */
    static @Nullable String read(CsvKind kind, byte[] bytes, Refusals refusals) {
        if (startsWith(bytes, ZIPPED_WORKBOOK) || startsWith(bytes, OLD_WORKBOOK)) {
            refusals.add(Cell.of(new Place(kind, 1, ""), "", "workbook"));
            return null;
        }
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder().onMalformedInput(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(in, out, true);
        String text = out.flip().toString();
        // UTF-16 without a mark can be valid UTF-8, with a NUL in every second place
        int nul = text.indexOf('\0');
        if (result.isError() || nul >= 0) {
            byte read = nul >= 0 ? 0 : bytes[in.position()];
            String before = nul >= 0 ? text.substring(0, nul) : text;
            Place at = new Place(kind, rowOf(before), "");
            refusals.add(Cell.of(at, String.format(Locale.ROOT, "0x%02X", read), "encoding"));
            return null;
        }
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    private static int rowOf(String before) {
        return 1 + (int) before.lines().skip(1).count();
    }

    private static boolean startsWith(byte[] bytes, byte[] mark) {
        return ByteBuffer.wrap(bytes, 0, Math.min(bytes.length, mark.length)).equals(ByteBuffer.wrap(mark));
    }
}
