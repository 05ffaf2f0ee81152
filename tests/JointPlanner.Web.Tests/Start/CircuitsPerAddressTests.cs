using System.Net.WebSockets;
using System.Text;
using JointPlanner.Web.Start;
using Microsoft.AspNetCore.Components.Server;
using Microsoft.AspNetCore.SignalR;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Options;

namespace JointPlanner.Web.Tests.Start;

public sealed class CircuitsPerAddressTests
{
    [Fact]
    public void Each_address_is_counted_by_itself_and_a_closed_page_makes_room()
    {
        var counted = new CircuitsPerAddress(2);
        Assert.True(counted.Enter("192.0.2.1"));
        Assert.True(counted.Enter("192.0.2.1"));
        Assert.False(counted.Enter("192.0.2.1"));
        Assert.False(counted.Enter("192.0.2.1"));
        Assert.True(counted.Enter("192.0.2.2"));
        counted.Leave("192.0.2.1");
        Assert.True(counted.Enter("192.0.2.1"));
        Assert.False(counted.Enter("192.0.2.1"));
    }

    [Fact]
    public async Task Of_twenty_one_connections_of_one_address_one_is_refused()
    {
        await using var site = new Site();
        site.UseKestrel(0);
        site.StartServer();
        var address = new UriBuilder(site.ClientOptions.BaseAddress) { Scheme = "ws", Path = "/_blazor" }.Uri;
        var sockets = Enumerable.Range(0, 21).Select(_ => new ClientWebSocket()).ToList();
        try
        {
            var ended = sockets.Select(socket => Ended(socket, address)).ToList();
            Assert.True(await await Task.WhenAny(ended).WaitAsync(TimeSpan.FromSeconds(30)));
            Assert.Equal(1, ended.Count(task => task.IsCompleted));
        }
        finally
        {
            foreach (var socket in sockets) socket.Dispose();
        }
    }

    [Fact]
    public async Task No_page_is_told_the_inside_of_an_error()
    {
        await using var site = new Site();
        Assert.False(site.Services.GetRequiredService<IOptions<CircuitOptions>>().Value.DetailedErrors);
        Assert.NotEqual(true, site.Services.GetRequiredService<IOptions<HubOptions>>().Value.EnableDetailedErrors);
    }

    // Says hello as the page's script does; comes back when the server closes.
    private static async Task<bool> Ended(ClientWebSocket socket, Uri address)
    {
        await socket.ConnectAsync(address, CancellationToken.None);
        await socket.SendAsync(Encoding.UTF8.GetBytes("{\"protocol\":\"blazorpack\",\"version\":1}\u001e"), WebSocketMessageType.Text, true, CancellationToken.None);
        var buffer = new byte[1024];
        try
        {
            while ((await socket.ReceiveAsync(buffer, CancellationToken.None)).MessageType != WebSocketMessageType.Close) { }
        }
        catch (WebSocketException)
        {
            // Closed without a farewell.
        }

        return true;
    }
}
