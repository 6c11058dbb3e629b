package plusward.exchange;

import java.io.IOException;
import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.springframework.web.multipart.MultipartFile;

/** The two files as they were chosen; either may be absent. */
final class CsvPair {

    private final Map<CsvKind, byte[]> bytes = new EnumMap<>(CsvKind.class);

    CsvPair(byte @Nullable [] children, byte @Nullable [] visits) {
        put(CsvKind.CHILDREN, children);
        put(CsvKind.VISITS, visits);
    }

    /** A part without a name and a byte is what a form sends when no file was chosen: absent. */
    static CsvPair of(@Nullable MultipartFile children, @Nullable MultipartFile visits) throws IOException {
        return new CsvPair(bytes(children), bytes(visits));
    }

    private static byte @Nullable [] bytes(@Nullable MultipartFile file) throws IOException {
        if (file == null || (file.isEmpty() && isUnnamed(file))) {
            return null;
        }
        return file.getBytes();
    }

    private static boolean isUnnamed(MultipartFile file) {
        String name = file.getOriginalFilename();
        return name == null || name.isEmpty();
    }

    private void put(CsvKind kind, byte @Nullable [] content) {
        if (content != null) {
            bytes.put(kind, content);
        }
    }

    boolean isEmpty() {
        return bytes.isEmpty();
    }

    byte @Nullable [] bytesOf(CsvKind kind) {
        return bytes.get(kind);
    }
}
