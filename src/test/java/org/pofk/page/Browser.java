package org.pofk.page;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** A Chromium without a window, driven by its own driver over WebDriver (W3C, 2018). */
final class Browser implements AutoCloseable {
    private static final Pattern STARTED = Pattern.compile("started successfully on port ([0-9]+)");
    private static final ObjectMapper JSON = new ObjectMapper();

    static {
        // the driver may close a connection between two questions; what it never read is asked again
        System.setProperty("jdk.httpclient.enableAllMethodRetry", "true");
    }

    private final Process driver;
    private final HttpClient client = HttpClient.newHttpClient();
    private final String session;

    private Browser(Process driver, String port) throws IOException {
        this.driver = driver;
        ObjectNode asked = JSON.createObjectNode();
        ObjectNode browser = asked.putObject("capabilities").putObject("alwaysMatch");
        browser.putObject("goog:loggingPrefs").put("browser", "ALL");
        browser.putObject("goog:chromeOptions").putArray("args").add("--headless=new").add("--no-sandbox")
                .add("--disable-gpu").add("--disable-dev-shm-usage");
        String sessions = "http://127.0.0.1:" + port + "/session";
        this.session = sessions + "/" + sent("POST", sessions, asked).path("sessionId").asText();
    }

    static Browser started() throws IOException {
        Process driver = new ProcessBuilder("chromedriver", "--port=0").redirectErrorStream(true).start();
        BufferedReader said = new BufferedReader(new InputStreamReader(driver.getInputStream(), StandardCharsets.UTF_8));
        StringBuilder all = new StringBuilder();
        for (String line = said.readLine(); line != null; line = said.readLine()) {
            Matcher started = STARTED.matcher(all.append(line).append('\n'));
            if (started.find()) {
                return new Browser(driver, started.group(1));
            }
        }
        throw new AssertionError("chromedriver doesn't start: " + all);
    }

    private JsonNode sent(String method, String address, JsonNode body) throws IOException {
        try {
            HttpRequest.BodyPublisher published = method.equals("POST")
                    ? HttpRequest.BodyPublishers.ofString(body.toString()) : HttpRequest.BodyPublishers.noBody();
            HttpResponse<String> answer = client.send(HttpRequest.newBuilder(URI.create(address))
                    .header("Content-Type", "application/json").method(method, published).build(),
                    HttpResponse.BodyHandlers.ofString());
            if (answer.statusCode() != 200) {
                throw new AssertionError(address + " " + body + ": " + answer.body());
            }
            return JSON.readTree(answer.body()).path("value");
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            throw new IOException(interrupted);
        }
    }

    void open(Path page) throws IOException {
        sent("POST", session + "/url", JSON.createObjectNode().put("url", page.toUri().toString()));
    }

    /** The size of what is seen of the page, whatever a window's least size is. */
    void resize(int width, int height) throws IOException {
        ObjectNode command = JSON.createObjectNode().put("cmd", "Emulation.setDeviceMetricsOverride");
        command.putObject("params").put("width", width).put("height", height).put("deviceScaleFactor", 1)
                .put("mobile", false);
        sent("POST", session + "/goog/cdp/execute", command);
    }

    /** What a function's body returns. */
    JsonNode run(String script) throws IOException {
        ObjectNode asked = JSON.createObjectNode().put("script", script);
        asked.putArray("args");
        return sent("POST", session + "/execute/sync", asked);
    }

    /** Types into the first element of a selector, by keys. */
    void type(String selector, String text) throws IOException {
        JsonNode element = sent("POST", session + "/element",
                JSON.createObjectNode().put("using", "css selector").put("value", selector));
        String address = session + "/element/" + element.elements().next().asText();
        sent("POST", address + "/clear", JSON.createObjectNode());
        sent("POST", address + "/value", JSON.createObjectNode().put("text", text));
    }

    /** What the console was told since the last time. */
    JsonNode console() throws IOException {
        return sent("POST", session + "/se/log", JSON.createObjectNode().put("type", "browser"));
    }

    @Override
    public void close() throws IOException {
        sent("DELETE", session, JSON.createObjectNode());
        driver.destroy();
    }
}
