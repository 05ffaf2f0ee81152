using System.Net;
using System.Net.Sockets;

namespace JointPlanner.EndToEnd.Tests.Sites;

/// <summary>A wire between browser and site that can be cut: open connections break, new ones are refused, until it is mended.</summary>
public sealed class Relay : IAsyncDisposable
{
    private readonly IPEndPoint target;
    private readonly int port;
    private readonly List<TcpClient> open = [];
    private TcpListener? listener;

    public Relay(string address)
    {
        target = new IPEndPoint(IPAddress.Loopback, new Uri(address).Port);
        port = Listen(0);
    }

    public string Address => $"http://127.0.0.1:{port}";

    /// <summary>Cuts the wire.</summary>
    public void Cut()
    {
        listener?.Dispose();
        listener = null;
        lock (open)
        {
            foreach (var end in open)
            {
                // Closing without waiting sends a reset: a cut, not a farewell. An end that has gone by itself has no socket left.
                end.Client?.Close(0);
                end.Dispose();
            }

            open.Clear();
        }
    }

    /// <summary>Joins it again.</summary>
    public void Mend() => Listen(port);

    public ValueTask DisposeAsync()
    {
        Cut();
        return ValueTask.CompletedTask;
    }

    private int Listen(int wanted)
    {
        listener = new TcpListener(IPAddress.Loopback, wanted) { ExclusiveAddressUse = false };
        listener.Start();
        _ = Accept(listener);
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }

    private async Task Accept(TcpListener on)
    {
        try
        {
            while (true) _ = Carry(await on.AcceptTcpClientAsync(), on);
        }
        catch (Exception cut) when (cut is SocketException or ObjectDisposedException or InvalidOperationException)
        {
            // The wire was cut.
        }
    }

    private async Task Carry(TcpClient browser, TcpListener on)
    {
        using var site = new TcpClient();
        using (browser)
        {
            try
            {
                await site.ConnectAsync(target);
                lock (open)
                {
                    if (!ReferenceEquals(on, listener)) return;
                    open.AddRange([browser, site]);
                }

                var there = browser.GetStream().CopyToAsync(site.GetStream());
                var back = site.GetStream().CopyToAsync(browser.GetStream());
                await Task.WhenAny(there, back);
            }
            catch (Exception cut) when (cut is IOException or SocketException or ObjectDisposedException or InvalidOperationException)
            {
                // One end went away; the other follows.
            }
        }
    }
}
