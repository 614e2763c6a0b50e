package org.pofk.bench;

/** What a Java process costs by itself. */
public final class Hello {
    private Hello() {
    }

    public static void main(String[] arguments) {
        System.out.println("hello");
    }
}
