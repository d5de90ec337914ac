package org.gasmargin.worksheet.layout;

/** The metadata packet that declares PDF/A-3a and PDF/UA-1. */
final class Xmp {
  private static final String PACKET =
      """
      <?xpacket begin="\ufeff" id="W5M0MpCehiHzreSzNTczkc9d"?>
      <x:xmpmeta xmlns:x="adobe:ns:meta/">
       <rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
        <rdf:Description rdf:about=""
          xmlns:dc="http://purl.org/dc/elements/1.1/"
          xmlns:pdf="http://ns.adobe.com/pdf/1.3/"
          xmlns:pdfaid="http://www.aiim.org/pdfa/ns/id/"
          xmlns:pdfuaid="http://www.aiim.org/pdfua/ns/id/"
          xmlns:pdfaExtension="http://www.aiim.org/pdfa/ns/extension/"
          xmlns:pdfaSchema="http://www.aiim.org/pdfa/ns/schema#"
          xmlns:pdfaProperty="http://www.aiim.org/pdfa/ns/property#">
         <dc:format>application/pdf</dc:format>
         <dc:title><rdf:Alt><rdf:li xml:lang="x-default">@TITLE@</rdf:li></rdf:Alt></dc:title>
         <dc:language><rdf:Bag><rdf:li>@LANGUAGE@</rdf:li></rdf:Bag></dc:language>
         <pdf:Producer>@PRODUCER@</pdf:Producer>
         <pdfaid:part>3</pdfaid:part>
         <pdfaid:conformance>A</pdfaid:conformance>
         <pdfuaid:part>1</pdfuaid:part>
         <pdfaExtension:schemas><rdf:Bag><rdf:li rdf:parseType="Resource">
          <pdfaSchema:schema>PDF/UA identification schema</pdfaSchema:schema>
          <pdfaSchema:namespaceURI>http://www.aiim.org/pdfua/ns/id/</pdfaSchema:namespaceURI>
          <pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>
          <pdfaSchema:property><rdf:Seq><rdf:li rdf:parseType="Resource">
           <pdfaProperty:name>part</pdfaProperty:name>
           <pdfaProperty:valueType>Integer</pdfaProperty:valueType>
           <pdfaProperty:category>internal</pdfaProperty:category>
           <pdfaProperty:description>part of the standard</pdfaProperty:description>
          </rdf:li></rdf:Seq></pdfaSchema:property>
         </rdf:li></rdf:Bag></pdfaExtension:schemas>
        </rdf:Description>
       </rdf:RDF>
      </x:xmpmeta>
      <?xpacket end="w"?>
      """;

  private Xmp() {}

  static String packet(String title, String producer, String language) {
    return PACKET
        .replace("@TITLE@", escaped(title))
        .replace("@PRODUCER@", escaped(producer))
        .replace("@LANGUAGE@", escaped(language));
  }

  /** The text without what metadata cannot hold: control characters and half characters. */
  static String clean(String text) {
    StringBuilder result = new StringBuilder();
    text.codePoints()
        .filter(c -> c >= ' ' && c != 0x7f && c != 0xfffe && c != 0xffff)
        .filter(c -> c < 0xd800 || c > 0xdfff)
        .forEach(result::appendCodePoint);
    return result.toString();
  }

  private static String escaped(String text) {
    return clean(text).replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
