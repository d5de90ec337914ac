package org.gasmargin.worksheet.layout;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;

/**
 * The colour profile that says what the greys of the sheet mean: a monitor grey of gamma 2.2, laid
 * out as the ICC profile format, version 2, asks.
 */
final class GrayProfile {
  static final String NAME = "Gray gamma 2.2";

  private static final int HEADER = 128;
  private static final int TAGS = 4;
  private static final int TABLE_END = HEADER + 4 + 12 * TAGS;

  private GrayProfile() {}

  static byte[] bytes() {
    byte[] description = description();
    byte[] copyright = text("No copyright; free to use");
    byte[] white = xyz(0.9642, 1.0, 0.8249);
    byte[] curve = gamma(2.2);
    int size = TABLE_END + description.length + copyright.length + white.length + curve.length;
    ByteBuffer profile = ByteBuffer.allocate(size);
    profile.putInt(size).putInt(0).putInt(0x02100000);
    profile.put(ascii("mntr")).put(ascii("GRAY")).put(ascii("XYZ "));
    for (short part : new short[] {2026, 1, 1, 0, 0, 0}) {
      profile.putShort(part);
    }
    profile.put(ascii("acsp"));
    profile.position(68);
    profile.putInt(fixed(0.9642)).putInt(fixed(1.0)).putInt(fixed(0.8249));
    profile.position(HEADER);
    profile.putInt(TAGS);
    int offset = TABLE_END;
    offset = entry(profile, "desc", offset, description);
    offset = entry(profile, "cprt", offset, copyright);
    offset = entry(profile, "wtpt", offset, white);
    entry(profile, "kTRC", offset, curve);
    profile.put(description).put(copyright).put(white).put(curve);
    return profile.array();
  }

  private static int entry(ByteBuffer profile, String tag, int offset, byte[] data) {
    profile.put(ascii(tag)).putInt(offset).putInt(data.length);
    return offset + data.length;
  }

  private static byte[] description() {
    byte[] name = ascii(NAME);
    int length = 12 + name.length + 1 + 4 + 4 + 2 + 1 + 67;
    ByteBuffer data = ByteBuffer.allocate(padded(length));
    data.put(ascii("desc")).putInt(0).putInt(name.length + 1).put(name);
    return data.array();
  }

  private static byte[] text(String words) {
    ByteBuffer data = ByteBuffer.allocate(padded(8 + words.length() + 1));
    data.put(ascii("text")).putInt(0).put(ascii(words));
    return data.array();
  }

  private static byte[] xyz(double x, double y, double z) {
    ByteBuffer data = ByteBuffer.allocate(20);
    data.put(ascii("XYZ ")).putInt(0).putInt(fixed(x)).putInt(fixed(y)).putInt(fixed(z));
    return data.array();
  }

  private static byte[] gamma(double gamma) {
    ByteBuffer data = ByteBuffer.allocate(16);
    data.put(ascii("curv")).putInt(0).putInt(1).putShort((short) Math.round(gamma * 256));
    return data.array();
  }

  private static int fixed(double value) {
    return (int) Math.round(value * 65536);
  }

  private static int padded(int length) {
    return (length + 3) / 4 * 4;
  }

  private static byte[] ascii(String text) {
    return text.getBytes(StandardCharsets.US_ASCII);
  }
}
