package lyate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** Whatever is packed into the program is named with its licence. */
class ThirdPartyTest {

    @Test
    void everyLibraryOfThePomIsListed() throws Exception {
        List<String> packed = packedLibraries();
        assertTrue(packed.size() > 10, packed.toString());
        String page = page();
        assertEquals(List.of(), packed.stream().filter(name -> !page.contains("`" + name + "`")).toList());
    }

    private static List<String> packedLibraries() throws Exception {
        NodeList found = DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(Path.of("pom.xml").toFile())
                .getDocumentElement().getElementsByTagName("dependency");
        List<String> packed = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            Element dependency = (Element) found.item(i);
            if (dependency.getElementsByTagName("scope").getLength() == 0) {
                packed.add(dependency.getElementsByTagName("artifactId").item(0).getTextContent());
            }
        }
        return packed;
    }

    private static String page() throws IOException {
        return Files.readString(Path.of("docs/licenses/third-party.md"));
    }
}
