[Version] 2.0
# Hz Z RI R 1
[Number of Ports] 3
[Number of Frequencies] 1
[Network Data]
1 0 0
[End]
